import { equation } from "../equation.ts";

/** Takes the C-weighted level: taking the SNR off dB(A) is wrong. */
export const protectionSnr = equation({
  id: "protection-snr",
  title: "level at the ear, SNR method",
  version: 1,
  tex: String.raw`L'_{\text{A}} = L_{\text{C}} - \text{SNR}`,
  value: { symbol: String.raw`L'_{\text{A}}`, unit: "dB" },
  inputs: {
    levelDbc: { kind: "one", symbol: String.raw`L_{\text{C}}`, unit: "dB", min: 0, max: 150 },
    snrDb: { kind: "one", symbol: String.raw`\text{SNR}`, unit: "dB", min: 0, max: 60 },
  },
  source: { document: "ISO 4869-2", edition: "2018", clause: "SNR method", checked: "read-secondary" },
  work: ({ levelDbc, snrDb }) => levelDbc - snrDb,
});
