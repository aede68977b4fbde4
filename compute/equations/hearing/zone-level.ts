import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

/** At full running over hard ground; 3 dB for each wall nearer to the machine than the edge. No air, soil or screen credit. */
export const zoneLevel = equation({
  id: "zone-level",
  title: "level for the ear-protection zone",
  version: 1,
  tex: String.raw`L = L_{W\text{A}} - 10 \lg\left( 2 \pi d^2 \right) + 3 n`,
  value: { symbol: "L", unit: "dB" },
  inputs: {
    powerDba: { kind: "one", symbol: String.raw`L_{W\text{A}}`, unit: "dB", min: 0, max: 160 },
    distanceM: { kind: "one", symbol: "d", unit: "m", min: 1, max: 10000 },
    walls: { kind: "one", symbol: "n", unit: "1", min: 0, max: 10, decimals: 0 },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "zone rule", checked: "derived" },
  refuse: ({ walls }) =>
    Number.isInteger(walls) ? undefined : new InputError("walls", walls, "a whole number of walls"),
  work: ({ powerDba, distanceM, walls }) => powerDba - 10 * Math.log10(2 * Math.PI * distanceM ** 2) + 3 * walls,
});
