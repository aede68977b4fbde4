import type { WalledMachine, ZoneMachine } from "../../compute/hearing/zone-machine.ts";

/** A machine 2 m square at (xM, 0), 110 dB(A), steady, in the open, without walls. */
export function machine(id: string, xM = 0, changes: Partial<ZoneMachine> = {}): WalledMachine {
  return {
    id,
    powerDba: 110,
    at: { xM, yM: 0 },
    outline: [
      { xM: xM - 1, yM: -1 },
      { xM: xM + 1, yM: -1 },
      { xM: xM + 1, yM: 1 },
      { xM: xM - 1, yM: 1 },
    ],
    swingM: 0,
    largestDimensionM: 2,
    wallsM: [],
    workStationDba: undefined,
    impulsive: false,
    peak: undefined,
    open: true,
    ...changes,
    walls: 0,
  };
}
