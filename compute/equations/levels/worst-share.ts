import { equation } from "../equation.ts";

/** Share of the worst averaging time: as many longest runs as fit, with the shortest stops between them. */
export const worstShare = equation({
  id: "worst-share",
  title: "running share of the worst averaging time",
  version: 1,
  tex: String.raw`\begin{aligned}
s &= \max\left( \frac{t}{100}, \min\left( 1, \frac{n r + \min\left( r, T - n \left(r + p\right) \right)}{T} \right) \right) \\
n &= \left\lfloor \frac{T}{r + p} \right\rfloor
\end{aligned}`,
  value: { symbol: "s", unit: "1", decimals: 3 },
  inputs: {
    onTimePct: { kind: "one", symbol: "t", unit: "%", min: 0, aboveMin: true, max: 100 },
    longestRunMin: { kind: "one", symbol: "r", unit: "min", min: 0, aboveMin: true, max: 1440 },
    shortestStopMin: { kind: "one", symbol: "p", unit: "min", min: 0, max: 1440 },
    averagingMin: { kind: "one", symbol: "T", unit: "min", min: 0, aboveMin: true, max: 60 },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "on-time and averaging", checked: "derived" },
  work: ({ onTimePct, longestRunMin: r, shortestStopMin: p, averagingMin: T }) => {
    const n = Math.floor(T / (r + p));
    return Math.max(onTimePct / 100, Math.min(1, (n * r + Math.min(r, T - n * (r + p))) / T));
  },
});
