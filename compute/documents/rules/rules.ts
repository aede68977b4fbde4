import type { Rule } from "../document-set.ts";
import { borrowedShapes } from "./borrowed-shapes.ts";
import { confirmations } from "./confirmations.ts";
import { dates } from "./dates.ts";
import { emissionLevels } from "./emission-levels.ts";
import { emptyTimes } from "./empty-times.ts";
import { enclosures } from "./enclosures.ts";
import { firstLanguage } from "./first-language.ts";
import { invented } from "./invented.ts";
import { knownInProject } from "./known-in-project.ts";
import { knownInStatement } from "./known-in-statement.ts";
import { knownSheets } from "./known-sheets.ts";
import { languages } from "./languages.ts";
import { limitPeriods } from "./limit-periods.ts";
import { linesAndOutlines } from "./lines-and-outlines.ts";
import { names } from "./names.ts";
import { obstacleIds } from "./obstacle-ids.ts";
import { operatorLevels } from "./operator-levels.ts";
import { plantPlaces } from "./plant-places.ts";
import { receptorPlaces } from "./receptor-places.ts";
import { runningTimes } from "./running-times.ts";
import { screenGaps } from "./screen-gaps.ts";
import { screenPanels } from "./screen-panels.ts";
import { standingOrder } from "./standing-order.ts";
import { timeZones } from "./time-zones.ts";
import { uniqueIds } from "./unique-ids.ts";
import { windows } from "./windows.ts";

/** All rules that no schema can hold. */
export const rules: readonly Rule[] = [
  names,
  uniqueIds,
  obstacleIds,
  knownSheets,
  knownInProject,
  knownInStatement,
  borrowedShapes,
  confirmations,
  dates,
  standingOrder,
  emptyTimes,
  windows,
  limitPeriods,
  firstLanguage,
  languages,
  timeZones,
  linesAndOutlines,
  plantPlaces,
  receptorPlaces,
  screenPanels,
  screenGaps,
  enclosures,
  emissionLevels,
  operatorLevels,
  runningTimes,
  invented,
];
