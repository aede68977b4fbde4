import { inject } from "vitest";
import type {} from "./site-setup.ts";

/** Where the demo's site stands, or a browser waits; fails with the reason if it could not be made. */
export function siteMade(what: "site" | "browser"): string {
  const made = inject(what);
  if (made.kind === "not-made") throw new Error(made.why);
  return made.at;
}
