import { equation } from "../equation.ts";

export const signSize = equation({
  id: "sign-size",
  title: "diameter of a mandatory sign",
  version: 1,
  tex: String.raw`d = \frac{1000 E}{40}`,
  value: { symbol: "d", unit: "mm", decimals: 0 },
  inputs: { viewingDistanceM: { kind: "one", symbol: "E", unit: "m", min: 0, aboveMin: true, max: 30 } },
  source: {
    document: "BGV A8",
    edition: "edition not noted",
    clause: "4.9, Z = 40; ASR A1.3, table of sign sizes",
    checked: "read",
  },
  work: ({ viewingDistanceM }) => (1000 * viewingDistanceM) / 40,
});
