import { equation } from "../equation.ts";

/** Thin rigid screen, point source, free field, receptor in the shadow. Uncapped. */
export const kurzeAnderson = equation({
  id: "kurze-anderson",
  title: "insertion loss of a thin screen, Kurze and Anderson",
  version: 1,
  tex: String.raw`D = \begin{cases} 5 & N = 0 \\ 5 + 20 \lg \frac{\sqrt{2 \pi N}}{\tanh \sqrt{2 \pi N}} & N > 0 \end{cases}`,
  value: { symbol: "D", unit: "dB" },
  inputs: { fresnelNumber: { kind: "one", symbol: "N", unit: "1", min: 0, max: 100000, decimals: 3 } },
  source: {
    document: "Bies, Hansen and Howard, Engineering Noise Control",
    edition: "5, 2017",
    clause: "5.3, eq. (5.138)",
    checked: "read-secondary",
  },
  work: ({ fresnelNumber }) => {
    if (fresnelNumber === 0) return 5;
    const root = Math.sqrt(2 * Math.PI * fresnelNumber);
    return 5 + 20 * Math.log10(root / Math.tanh(root));
  },
});
