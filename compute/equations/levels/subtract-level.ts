import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

export const subtractLevel = equation({
  id: "subtract-level",
  title: "energetic difference of two levels",
  version: 1,
  tex: String.raw`L = 10 \lg\left( 10^{0.1 L_1} - 10^{0.1 L_2} \right)`,
  value: { symbol: "L", unit: "dB" },
  inputs: {
    totalDb: { kind: "one", symbol: "L_1", ...anyLevel },
    partDb: { kind: "one", symbol: "L_2", ...anyLevel },
  },
  source: {
    document: "ISO/TR 25417",
    edition: "2007",
    clause: "definition of the level, energies subtracted",
    checked: "derived",
  },
  refuse: ({ totalDb, partDb }) =>
    10 ** (0.1 * totalDb) > 10 ** (0.1 * partDb)
      ? undefined
      : new InputError(
          "totalDb",
          totalDb,
          `a level above partDb (${partDb} dB)`,
          "A part cannot be louder than the total",
        ),
  work: ({ totalDb, partDb }) => 10 * Math.log10(10 ** (0.1 * totalDb) - 10 ** (0.1 * partDb)),
});
