import { pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const airAttenuation = equation({
  id: "air-attenuation",
  title: "attenuation by the air along a path",
  version: 1,
  tex: String.raw`A_{\text{atm}} = \frac{\alpha d}{1000}`,
  value: { symbol: String.raw`A_{\text{atm}}`, unit: "dB" },
  inputs: {
    absorptionDbKm: { kind: "one", symbol: String.raw`\alpha`, unit: "dB/km", min: 0, max: 1000 },
    distanceM: { kind: "one", symbol: "d", ...pathLength },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.2, eq. (8)", checked: "read-secondary" },
  work: ({ absorptionDbKm, distanceM }) => (absorptionDbKm * distanceM) / 1000,
});
