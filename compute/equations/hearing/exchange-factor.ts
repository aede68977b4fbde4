import { equation } from "../equation.ts";

export const exchangeFactor = equation({
  id: "exchange-factor",
  title: "dB per tenfold time at an exchange rate",
  version: 1,
  tex: String.raw`K = \frac{q}{\lg 2}`,
  value: { symbol: "K", unit: "dB", decimals: 2 },
  inputs: { exchangeRateDb: { kind: "one", symbol: "q", unit: "dB", min: 3, max: 5, oneOf: [3, 4, 5], decimals: 0 } },
  source: { document: "29 CFR 1910.95", edition: "Appendix A", clause: "16.61 = 5/lg 2", checked: "read" },
  work: ({ exchangeRateDb }) => exchangeRateDb / Math.log10(2),
});
