import { zoneReach } from "./zone-distance.ts";
import type { WalledMachine, ZoneMachine } from "./zone-machine.ts";

/**
 * Counts for each machine the walls nearer to it than the edge of its zone. A wall moves the edge out, and the edge may then
 * pass another wall: counting starts with walls nearer than 1 m and goes on until no edge passes a further wall.
 *
 * @param machines  all machines that may run at the same time
 * @param edgeDba   edge level [dB(A)]
 */
export function withWalls(machines: readonly ZoneMachine[], edgeDba: number): readonly WalledMachine[] {
  let counted = machines.map((machine) => ({ ...machine, walls: wallsWithin(machine, 1) }));
  for (;;) {
    const now = counted;
    const next = now.map((machine) => {
      const nextM = [...machine.wallsM].sort((a, b) => a - b)[machine.walls];
      const reachM = nextM === undefined ? 0 : (zoneReach(machine, now, edgeDba, nextM)?.distanceM ?? 0);
      return { ...machine, walls: Math.max(machine.walls, wallsWithin(machine, reachM)) };
    });
    if (next.every((machine, index) => machine.walls === now[index]?.walls)) return next;
    counted = next;
  }
}

function wallsWithin(machine: ZoneMachine, distanceM: number): number {
  return machine.wallsM.filter((wallM) => wallM < distanceM).length;
}
