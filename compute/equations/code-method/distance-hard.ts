import { pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const distanceHard = equation({
  id: "distance-hard",
  title: "distance attenuation over hard ground",
  version: 1,
  tex: String.raw`K_{\text{h}} = 20 \lg \frac{R}{R_0}`,
  value: { symbol: String.raw`K_{\text{h}}`, unit: "dB" },
  inputs: {
    distanceM: { kind: "one", symbol: "R", ...pathLength },
    referenceM: { kind: "one", symbol: "R_0", ...pathLength },
  },
  source: { document: "BS 5228-1", edition: "2009+A1:2014", clause: "Annex F, F.2.2", checked: "memory" },
  work: ({ distanceM, referenceM }) => 20 * Math.log10(distanceM / referenceM),
});
