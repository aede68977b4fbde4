import { anyLevel, pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const haulRouteLevel = equation({
  id: "haul-route-level",
  title: "hourly level of a regularly used haul route",
  version: 1,
  tex: String.raw`L_{\text{Aeq,1h}} = L_{W\text{A}} - 33 + 10 \lg Q - 10 \lg V - 10 \lg d`,
  value: { symbol: String.raw`L_{\text{Aeq,1h}}`, unit: "dB" },
  inputs: {
    powerDb: { kind: "one", symbol: String.raw`L_{W\text{A}}`, ...anyLevel },
    passesPerHour: { kind: "one", symbol: "Q", unit: "1/h", min: 0, aboveMin: true, max: 10000 },
    speedKmh: { kind: "one", symbol: "V", unit: "km/h", min: 0, aboveMin: true, max: 130 },
    distanceM: { kind: "one", symbol: "d", ...pathLength },
  },
  source: { document: "BS 5228-1", edition: "2009+A1:2014", clause: "Annex F, F.2.5", checked: "memory" },
  work: ({ powerDb, passesPerHour, speedKmh, distanceM }) =>
    powerDb - 33 + 10 * Math.log10(passesPerHour) - 10 * Math.log10(speedKmh) - 10 * Math.log10(distanceM),
});
