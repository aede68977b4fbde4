import { distance } from "fastest-levenshtein";

/** The candidate a mistyped word most likely stands for: no more than a third of its signs differ. */
export function nearest(word: string, candidates: Iterable<string>): string | undefined {
  let best: { readonly candidate: string; readonly away: number } | undefined;
  for (const candidate of [...candidates].sort()) {
    const away = distance(word.toLowerCase(), candidate.toLowerCase());
    if (away <= Math.max(word.length, candidate.length) / 3 && away < (best?.away ?? Number.POSITIVE_INFINITY))
      best = { candidate, away };
  }
  return best?.candidate;
}
