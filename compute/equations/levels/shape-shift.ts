import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Borrows the octave shape of a like item for a level known only as an A-weighted total. */
export const shapeShift = equation({
  id: "shape-shift",
  title: "band level from a borrowed octave shape",
  version: 1,
  tex: String.raw`L_i = S_i + \left(L_{\text{A}} - L_{\text{A},S}\right)`,
  value: { symbol: "L_i", unit: "dB" },
  inputs: {
    shapeDb: { kind: "one", symbol: "S_i", ...anyLevel },
    shapeTotalDba: { kind: "one", symbol: String.raw`L_{\text{A},S}`, ...anyLevel },
    levelDba: { kind: "one", symbol: String.raw`L_{\text{A}}`, ...anyLevel },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "octave shape rule", checked: "derived" },
  work: ({ shapeDb, shapeTotalDba, levelDba }) => shapeDb + (levelDba - shapeTotalDba),
});
