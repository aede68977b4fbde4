import { equation } from "../equation.ts";

export const onTimeCorrection = equation({
  id: "on-time-correction",
  title: "correction for running part of the time",
  version: 1,
  tex: String.raw`K_T = 10 \lg \frac{t}{100}`,
  value: { symbol: "K_T", unit: "dB" },
  inputs: { onTimePct: { kind: "one", symbol: "t", unit: "%", min: 0, aboveMin: true, max: 100 } },
  source: { document: "BS 5228-1", edition: "2009+A1:2014", clause: "Annex F, on-time correction", checked: "derived" },
  work: ({ onTimePct }) => 10 * Math.log10(onTimePct / 100),
});
