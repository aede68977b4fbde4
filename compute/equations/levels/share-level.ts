import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const shareLevel = equation({
  id: "share-level",
  title: "level of something that runs a share of the time",
  version: 1,
  tex: String.raw`L_s = L + 10 \lg s`,
  value: { symbol: "L_s", unit: "dB" },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...anyLevel },
    share: { kind: "one", symbol: "s", unit: "1", min: 0, aboveMin: true, max: 1, decimals: 3 },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "on-time and averaging", checked: "derived" },
  work: ({ levelDb, share }) => levelDb + 10 * Math.log10(share),
});
