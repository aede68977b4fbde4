import { exposureLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const equalEnergyTime = equation({
  id: "equal-energy-time",
  title: "time in which a level uses up the criterion, equal energy",
  version: 1,
  tex: String.raw`T = 8 \cdot 10^{\left(L_{\text{c}} - L\right)/10}`,
  value: { symbol: "T", unit: "h", decimals: 2 },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...exposureLevel },
    criterionDb: { kind: "one", symbol: String.raw`L_{\text{c}}`, unit: "dB", min: 70, max: 100 },
  },
  source: {
    document: "S.I. 2005/1643",
    edition: "2005",
    clause: "Schedule 1, Part 1, solved for the time",
    checked: "derived",
  },
  work: ({ levelDb, criterionDb }) => 8 * 10 ** ((criterionDb - levelDb) / 10),
});
