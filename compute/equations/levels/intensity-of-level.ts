import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const intensityOfLevel = equation({
  id: "intensity-of-level",
  title: "sound intensity of a level",
  version: 1,
  tex: String.raw`I = 10^{-12} \cdot 10^{0.1 L_I}`,
  value: { symbol: "I", unit: "W/m²" },
  inputs: { levelDb: { kind: "one", symbol: "L_I", ...anyLevel } },
  source: { document: "ISO/TR 25417", edition: "2007", clause: "sound intensity level", checked: "read-secondary" },
  work: ({ levelDb }) => 1e-12 * 10 ** (0.1 * levelDb),
});
