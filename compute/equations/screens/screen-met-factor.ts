import { equation } from "../equation.ts";

/** For edges above the ground only; round a vertical edge the factor is 1. */
export const screenMetFactor = equation({
  id: "screen-met-factor",
  title: "meteorological factor of a screen",
  version: 1,
  tex: String.raw`K_{\text{met}} = \begin{cases} \exp\left( -\frac{1}{2000} \sqrt{\frac{d_{\text{ss}} d_{\text{sr}} d}{2 z}} \right) & z > 0 \\ 1 & z \le 0 \end{cases}`,
  value: { symbol: String.raw`K_{\text{met}}`, unit: "1", decimals: 3 },
  inputs: {
    sourceToEdgeM: { kind: "one", symbol: String.raw`d_{\text{ss}}`, unit: "m", min: 0, max: 10000 },
    edgeToReceptorM: { kind: "one", symbol: String.raw`d_{\text{sr}}`, unit: "m", min: 0, max: 10000 },
    distanceM: { kind: "one", symbol: "d", unit: "m", min: 0, aboveMin: true, max: 10000 },
    pathDifferenceM: { kind: "one", symbol: "z", unit: "m", min: -30000, max: 30000, decimals: 3 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.4, eq. (18)", checked: "read-secondary" },
  work: ({ sourceToEdgeM, edgeToReceptorM, distanceM, pathDifferenceM: z }) =>
    z > 0 ? Math.exp(-Math.sqrt((sourceToEdgeM * edgeToReceptorM * distanceM) / (2 * z)) / 2000) : 1,
});
