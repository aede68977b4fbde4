import { exposureLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Halving form. It differs from equal-energy-time by 0.24 % per 3 dB: the duty set names which one its law uses. */
export const permittedTime = equation({
  id: "permitted-time",
  title: "permitted time at a level, halving per exchange rate",
  version: 1,
  tex: String.raw`T = \frac{8}{2^{\left(L - L_{\text{c}}\right)/q}}`,
  value: { symbol: "T", unit: "h", decimals: 2 },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...exposureLevel },
    criterionDb: { kind: "one", symbol: String.raw`L_{\text{c}}`, unit: "dB", min: 70, max: 100 },
    exchangeRateDb: { kind: "one", symbol: "q", unit: "dB", min: 3, max: 5, oneOf: [3, 4, 5], decimals: 0 },
  },
  source: {
    document: "29 CFR 1910.95",
    edition: "Appendix A",
    clause: "Table G-16a; NIOSH 98-126, table 1-1",
    checked: "read",
  },
  work: ({ levelDb, criterionDb, exchangeRateDb }) => 8 / 2 ** ((levelDb - criterionDb) / exchangeRateDb),
});
