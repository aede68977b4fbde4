import type { EdgePoint, TopEdge } from "./obstacle.ts";

/** Lengths of the shortest way over one or two edges, as ISO 9613-2:1996, eq. (16) and (17), measure it. */
export interface EdgeLengths {
  readonly sourceToEdgeM: number;
  readonly betweenEdgesM: number;
  readonly edgeToReceptorM: number;
  /** Component of the straight line along parallel edges; 0 where the edges are not parallel. */
  readonly alongEdgeM: number;
}

type Vector = readonly [x: number, y: number, z: number];

/** Edges whose directions differ by less than this are parallel [rad]. */
const PARALLEL = 1e-6;

/** Lengths over a single edge, level or sloping: in the plane square to it, and along it. */
export function overOneEdge(source: EdgePoint, receptor: EdgePoint, edge: TopEdge): EdgeLengths {
  const along = unit(minus(vector(edge[1]), vector(edge[0])));
  return {
    sourceToEdgeM: squareTo(minus(vector(source), vector(edge[0])), along),
    betweenEdgesM: 0,
    edgeToReceptorM: squareTo(minus(vector(receptor), vector(edge[0])), along),
    alongEdgeM: Math.abs(dot(minus(vector(receptor), vector(source)), along)),
  };
}

/** Lengths over two edges: by eq. (17) where they are parallel, else along the true shortest way. */
export function overTwoEdges(source: EdgePoint, receptor: EdgePoint, first: TopEdge, second: TopEdge): EdgeLengths {
  const along = unit(minus(vector(first[1]), vector(first[0])));
  const other = unit(minus(vector(second[1]), vector(second[0])));
  if (Math.abs(dot(along, other)) < Math.cos(PARALLEL)) return shortestOverTwo(source, receptor, first, second);
  return {
    sourceToEdgeM: squareTo(minus(vector(source), vector(first[0])), along),
    betweenEdgesM: squareTo(minus(vector(second[0]), vector(first[0])), along),
    edgeToReceptorM: squareTo(minus(vector(receptor), vector(second[0])), along),
    alongEdgeM: Math.abs(dot(minus(vector(receptor), vector(source)), along)),
  };
}

/**
 * The way over two edges that are not parallel. Its length is convex in the place on the second edge, the place on the first being
 * the best for it: the range that holds the least is cut by thirds.
 */
function shortestOverTwo(source: EdgePoint, receptor: EdgePoint, first: TopEdge, second: TopEdge): EdgeLengths {
  const [s, r, from] = [vector(source), vector(receptor), vector(second[0])];
  const along = unit(minus(vector(second[1]), from));
  const over = (t: number): EdgeLengths => {
    const onSecond = at(from, along, t);
    const onFirst = bestPlace(s, onSecond, first);
    return {
      sourceToEdgeM: length(minus(onFirst, s)),
      betweenEdgesM: length(minus(onSecond, onFirst)),
      edgeToReceptorM: length(minus(r, onSecond)),
      alongEdgeM: 0,
    };
  };
  const total = (t: number) => {
    const { sourceToEdgeM, betweenEdgesM, edgeToReceptorM } = over(t);
    return sourceToEdgeM + betweenEdgesM + edgeToReceptorM;
  };
  // No place on the shortest way is farther from the receptor point than the way by the foot of its own square is long.
  const foot = dot(minus(r, from), along);
  let [low, high] = [foot - total(foot), foot + total(foot)];
  while (high - low > 1e-7) {
    const third = (high - low) / 3;
    if (total(low + third) < total(high - third)) high -= third;
    else low += third;
  }
  return over((low + high) / 2);
}

/** The place of an edge's line on the shortest way from `a` to `b` over it: the line unfolded, it divides in the ratio of the distances. */
function bestPlace(a: Vector, b: Vector, edge: TopEdge): Vector {
  const from = vector(edge[0]);
  const along = unit(minus(vector(edge[1]), from));
  const [fromA, fromB] = [minus(a, from), minus(b, from)];
  const [distanceA, distanceB] = [squareTo(fromA, along), squareTo(fromB, along)];
  const share = distanceA + distanceB === 0 ? 0 : distanceA / (distanceA + distanceB);
  return at(from, along, dot(fromA, along) + share * (dot(fromB, along) - dot(fromA, along)));
}

/** The place at a distance along a direction. */
function at(from: Vector, along: Vector, distanceM: number): Vector {
  return [from[0] + distanceM * along[0], from[1] + distanceM * along[1], from[2] + distanceM * along[2]];
}

function vector(point: EdgePoint): Vector {
  return [point.xM, point.yM, point.levelM];
}

function minus(a: Vector, b: Vector): Vector {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}

function dot(a: Vector, b: Vector): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

function length(a: Vector): number {
  return Math.sqrt(dot(a, a));
}

function unit(a: Vector): Vector {
  const size = length(a);
  return [a[0] / size, a[1] / size, a[2] / size];
}

/** Length of the part of `a` that is square to a direction. */
function squareTo(a: Vector, along: Vector): number {
  return Math.sqrt(Math.max(0, dot(a, a) - dot(a, along) ** 2));
}
