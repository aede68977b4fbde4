import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

/** Octave bands 63 to 8000 Hz, printed weights of IEC 61672-1. */
const WEIGHTS_DB: readonly number[] = [-26.2, -16.1, -8.6, -3.2, 0, 1.2, 1.0, -1.1];

/** Unrounded; the standard rounds the final result to a whole dB. */
export const protectionOctave = equation({
  id: "protection-octave",
  title: "level at the ear, octave band method",
  version: 1,
  tex: String.raw`\begin{aligned}
L'_{\text{A}} &= 10 \lg \sum_{i=1}^{8} 10^{0.1 \left(L_i + A_i - P_i\right)} \\
A_i &= -26.2, -16.1, -8.6, -3.2, 0, 1.2, 1.0, -1.1
\end{aligned}`,
  value: { symbol: String.raw`L'_{\text{A}}`, unit: "dB" },
  inputs: {
    levelsDb: { kind: "many", symbol: "L_i", unit: "dB", min: 0, max: 150 },
    assumedProtectionDb: { kind: "many", symbol: "P_i", unit: "dB", min: -10, max: 60, sameLengthAs: "levelsDb" },
  },
  source: { document: "ISO 4869-2", edition: "2018", clause: "octave-band method", checked: "read-secondary" },
  refuse: ({ levelsDb }) =>
    levelsDb.length === 8
      ? undefined
      : new InputError(
          "levelsDb",
          levelsDb.length,
          "eight octave bands, 63 to 8000 Hz",
          "If 63 Hz is missing, this method cannot be used",
        ),
  work: ({ levelsDb, assumedProtectionDb }) =>
    10 *
    Math.log10(
      WEIGHTS_DB.reduce(
        (sum, weight, i) => sum + 10 ** (0.1 * ((levelsDb[i] ?? 0) + weight - (assumedProtectionDb[i] ?? 0))),
        0,
      ),
    ),
});
