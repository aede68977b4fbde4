import type { SealedPath, SealedTerms } from "../documents/types/revision.gen.ts";

/** All terms of one path in whole thousandths, whether they stand with the path, with its line, or not at all. */
export interface ResolvedPath {
  readonly distanceM: number;
  readonly directivityDb: number;
  readonly divergenceDb: number;
  readonly airDb: readonly number[];
  readonly groundDb: readonly number[];
  readonly screenDb: readonly number[];
  readonly reflectionDb: readonly number[];
  readonly capDb: readonly number[];
  readonly levelDb: readonly number[];
}

/** The terms of a path of a sealed term table: a reflected path has a line of its own, what is absent is 0. */
export function resolvedPath(terms: SealedTerms, path: SealedPath): ResolvedPath {
  const nothing = path.levelDb.map(() => 0);
  const line = path.own ?? { ...terms, reflectionDb: nothing };
  return {
    distanceM: line.distanceM,
    directivityDb: line.directivityDb,
    divergenceDb: line.divergenceDb,
    airDb: line.airDb,
    groundDb: line.groundDb,
    reflectionDb: line.reflectionDb,
    screenDb: path.screenDb,
    capDb: path.capDb ?? nothing,
    levelDb: path.levelDb,
  };
}
