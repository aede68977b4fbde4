import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

/** Lengths in metres that a path over an edge may be shorter than the straight one: rounding in the geometry. */
const ROUNDING_M = 1e-6;

/**
 * Path over one edge (betweenEdgesM 0) or two, less the straight distance. The first three lengths lie in the plane
 * square to the edge. With sightBlocked 0 the sight line passes above the edge and the difference is negative.
 */
export const pathDifference = equation({
  id: "path-difference",
  title: "path difference over an edge",
  version: 1,
  tex: String.raw`\begin{aligned}
z &= \begin{cases} \delta & b = 1 \\ -\delta & b = 0 \end{cases} \\
\delta &= \sqrt{\left(d_{\text{ss}} + d_{\text{sr}} + e\right)^2 + a^2} - d
\end{aligned}`,
  value: { symbol: "z", unit: "m", decimals: 3 },
  inputs: {
    sourceToEdgeM: { kind: "one", symbol: String.raw`d_{\text{ss}}`, unit: "m", min: 0, max: 10000 },
    betweenEdgesM: { kind: "one", symbol: "e", unit: "m", min: 0, max: 10000 },
    edgeToReceptorM: { kind: "one", symbol: String.raw`d_{\text{sr}}`, unit: "m", min: 0, max: 10000 },
    alongEdgeM: { kind: "one", symbol: "a", unit: "m", min: 0, max: 10000 },
    distanceM: { kind: "one", symbol: "d", unit: "m", min: 0, aboveMin: true, max: 10000 },
    sightBlocked: { kind: "one", symbol: "b", unit: "1", min: 0, max: 1, oneOf: [0, 1], decimals: 0 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.4, eqs. (16) and (17)", checked: "read-secondary" },
  refuse: (lengths) =>
    detourM(lengths) >= -ROUNDING_M
      ? undefined
      : new InputError(
          "distanceM",
          lengths.distanceM,
          `no more than the path over the edge (${detourM(lengths) + lengths.distanceM} m)`,
          "The straight distance is the shortest",
        ),
  work: (lengths) => (lengths.sightBlocked === 1 ? detourM(lengths) : -detourM(lengths)),
});

interface Lengths {
  readonly sourceToEdgeM: number;
  readonly betweenEdgesM: number;
  readonly edgeToReceptorM: number;
  readonly alongEdgeM: number;
  readonly distanceM: number;
}

function detourM({ sourceToEdgeM, betweenEdgesM, edgeToReceptorM, alongEdgeM, distanceM }: Lengths): number {
  return Math.sqrt((sourceToEdgeM + edgeToReceptorM + betweenEdgesM) ** 2 + alongEdgeM ** 2) - distanceM;
}
