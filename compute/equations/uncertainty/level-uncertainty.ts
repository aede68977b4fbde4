import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** What the sources share (the propagation method, the meter) does not average out, so it stands outside the sum. */
export const levelUncertainty = equation({
  id: "level-uncertainty",
  title: "standard uncertainty of an energetic sum",
  version: 1,
  tex: String.raw`u = \sqrt{ u_{\text{s}}^2 + \frac{\sum_{i=1}^{n} \left( 10^{0.1 L_i} u_i \right)^2}{\left( \sum_{i=1}^{n} 10^{0.1 L_i} \right)^2} }`,
  value: { symbol: "u", unit: "dB" },
  inputs: {
    levelsDb: { kind: "many", symbol: "L_i", ...anyLevel },
    ownUncertaintiesDb: { kind: "many", symbol: "u_i", unit: "dB", min: 0, max: 20, sameLengthAs: "levelsDb" },
    sharedUncertaintyDb: { kind: "one", symbol: String.raw`u_{\text{s}}`, unit: "dB", min: 0, max: 20 },
  },
  source: { document: "JCGM 100", edition: "2008", clause: "5.1, law of propagation", checked: "derived" },
  work: ({ levelsDb, ownUncertaintiesDb, sharedUncertaintyDb }) => {
    let energy = 0;
    let spread = 0;
    for (const [i, level] of levelsDb.entries()) {
      energy += 10 ** (0.1 * level);
      spread += (10 ** (0.1 * level) * (ownUncertaintiesDb[i] ?? 0)) ** 2;
    }
    return Math.sqrt(sharedUncertaintyDb ** 2 + spread / energy ** 2);
  },
});
