import { airRows } from "./acoustics/air.ts";
import { enclosureRows } from "./acoustics/enclosures.ts";
import { flatSceneRows } from "./acoustics/flat-scenes.ts";
import { groundRows } from "./acoustics/ground.ts";
import { levelRows } from "./acoustics/levels.ts";
import { screenRows } from "./acoustics/screens.ts";
import { thinScreenRows } from "./acoustics/thin-screens.ts";
import { uncertaintyRows } from "./acoustics/uncertainty.ts";
import type { RowGroup } from "./row.ts";

/** Every row of acoustics-check-values.json. */
export const acousticsRows: readonly RowGroup[] = [
  ...levelRows,
  ...airRows,
  ...groundRows,
  ...flatSceneRows,
  ...screenRows,
  ...thinScreenRows,
  ...enclosureRows,
  ...uncertaintyRows,
];
