import { equations } from "../../../compute/equations/registry.ts";

/** Wall across the line from source to receptor, as the reference scenes describe it. */
export interface Wall {
  readonly hs_m: number;
  readonly hr_m: number;
  readonly barrier_top_m: number;
  readonly source_to_barrier_m: number;
  readonly barrier_to_receiver_m: number;
}

export interface Edge {
  readonly sourceToEdgeM: number;
  readonly edgeToReceptorM: number;
  readonly distanceM: number;
  readonly pathDifferenceM: number;
}

/** Edge of a path over (0, source height), (edge x, edge height), (receptor x, receptor height) in one plane. */
export function edgeOf(
  source: readonly [number, number],
  edge: readonly [number, number],
  receptor: readonly [number, number],
): Edge {
  const between = (a: readonly [number, number], b: readonly [number, number]) => Math.hypot(a[0] - b[0], a[1] - b[1]);
  const lengths = {
    sourceToEdgeM: between(source, edge),
    edgeToReceptorM: between(edge, receptor),
    distanceM: between(source, receptor),
  };
  const pathDifferenceM = equations["path-difference"].of({
    ...lengths,
    betweenEdgesM: 0,
    alongEdgeM: 0,
    sightBlocked: 1,
  });
  return { ...lengths, pathDifferenceM };
}

export function topEdge(wall: Wall): Edge {
  const { hs_m, hr_m, barrier_top_m, source_to_barrier_m, barrier_to_receiver_m } = wall;
  return edgeOf([0, hs_m], [source_to_barrier_m, barrier_top_m], [source_to_barrier_m + barrier_to_receiver_m, hr_m]);
}

export function metFactor(edge: Edge): number {
  return equations["screen-met-factor"].of(edge);
}

/** D_z of an edge in a band. */
export function diffraction(
  edge: Edge,
  groundConstant: number,
  met: number,
  capDb: number,
  edgeFactor: (bandHz: number) => number,
) {
  return (bandHz: number) =>
    equations["screen-attenuation"].of({
      bandHz,
      pathDifferenceM: edge.pathDifferenceM,
      groundConstant,
      edgeFactor: edgeFactor(bandHz),
      metFactor: met,
      capDb,
    });
}

export const single = () => 1;
export const double = (betweenEdgesM: number) => (bandHz: number) =>
  equations["double-edge-factor"].of({ bandHz, betweenEdgesM });
