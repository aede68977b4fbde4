/** One page of each type, by its file in the demo's site. */
export const PAGE_TYPES = {
  home: "index.html",
  project: "saltpan-quay/index.html",
  statement: "saltpan-quay/breaking-out/index.html",
  workings: "saltpan-quay/breaking-out/workings/index.html",
  "ear-protection": "saltpan-quay/breaking-out/ear-protection/index.html",
  "data sheet": "data-sheets/plant/vibratory-pile-driver/index.html",
  "limit set": "limits/merrow-haven-consent/index.html",
  "duty set": "duties/uk-noise-at-work-2005/index.html",
  calculation: "calculation/index.html",
} as const;

export type PageType = keyof typeof PAGE_TYPES;

export const pageTypes = Object.entries(PAGE_TYPES) as readonly (readonly [PageType, string])[];
