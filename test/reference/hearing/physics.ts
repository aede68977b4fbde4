import { equations } from "../../../compute/equations/registry.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

export const physicsRows: readonly RowGroup[] = [
  tested<{ L: number }>({
    ids: ["phys-I0", "phys-I-90", "phys-I-120", "phys-I-140", "phys-I-160"],
    equations: ["intensity-of-level"],
    against: "OpenStax College Physics, table of intensities",
    work: ({ L }) => equations["intensity-of-level"].of({ levelDb: L }),
  }),
  tested<{ I: number }>({
    ids: ["phys-jackhammer-1m"],
    equations: ["level-of-intensity"],
    against: "a handbook table of intensities",
    note: "checks the formula only: as a level of plant the row is 12 to 21 dB low",
    work: ({ I }) => equations["level-of-intensity"].of({ intensityWm2: I }),
  }),
  leftOut("measured facts, not results of an equation", [
    ...["meas-jackhammer-range", "meas-chiphammer-range", "iso226-min", "iso226-1k", "canal-resonance"],
  ]),
];
