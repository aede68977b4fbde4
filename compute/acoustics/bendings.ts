import { screenOverTop } from "../equations/screens/screen-over-top.ts";
import { screenOverTopLiteral } from "../equations/screens/screen-over-top-literal.ts";
import type { Working } from "../equations/working.ts";
import type { BandHz } from "./bands.ts";
import type { Line } from "./line.ts";
import type { Way } from "./obstacles/way.ts";
import type { MixedWay, Ways } from "./obstacles/ways-between.ts";
import { waysBetween } from "./obstacles/ways-between.ts";
import { NOT_COUNTED_DB, type PathKind } from "./path-terms.ts";
import { screenLossDb } from "./screen-loss.ts";
import type { Method } from "./site.ts";

/** One of the paths past what a line crosses. */
export interface Bending {
  /** `over`, `left`, `right`, `left-of-<obstacle>`, `right-of-<obstacle>`, `through-<screen>`: what tells it from the other paths of its line. */
  readonly name: string;
  readonly kind: PathKind;
  readonly past: readonly string[];
  /** The way at 8 kHz, where everything counts; absent for sound through a screen with nothing else in its way. */
  readonly way: Way | undefined;
  /** Abar in one band [dB]: over the top 0 where nothing counts in it, on other ways `NOT_COUNTED_DB` where there is then no such way. */
  readonly lossDb: (working: Working, method: Method, distanceM: number, groundDb: number, bandHz: BandHz) => number;
}

/**
 * The paths past what a line crosses: over the top (which holds the ground term, eq. (12)); round both ends of all of it, or of one
 * obstacle and over the others (which keep it, eq. (13)); and through each screen that stands in the line of sight and lets sound
 * through, and over the others. A reflected line is followed over the top only.
 */
export function bendings(line: Line): readonly Bending[] {
  if (line.crossed.length === 0) return [];
  const byBand = waysBetween(line.crossed, line.source, line.receptor);
  const all = byBand.get(8000) as Ways;
  const waysIn = (bandHz: BandHz) => byBand.get(bandHz) as Ways;
  if (line.reflectedBy !== undefined) return all.over ? [overTop(all.over, waysIn, "reflected")] : [];
  return [
    ...(all.over ? [overTop(all.over, waysIn, "over")] : []),
    ...roundAll("left", all, waysIn),
    ...roundAll("right", all, waysIn),
    ...all.mixed.map((way) => roundOne(way, waysIn)),
    ...all.through.map(({ obstacle, others }) => through(obstacle.id, others, waysIn)),
  ];
}

type WaysIn = (bandHz: BandHz) => Ways;

function overTop(way: Way, waysIn: WaysIn, kind: PathKind): Bending {
  return {
    name: "over",
    kind,
    past: way.obstacles,
    way,
    lossDb: (working, method, distanceM, groundDb, bandHz) =>
      overLossDb(working, method, waysIn(bandHz).over, distanceM, groundDb, bandHz),
  };
}

/** Round all that stands in the line of sight, and over the rims of excavations. */
function roundAll(side: "left" | "right", { [side]: way, rims }: Ways, waysIn: WaysIn): readonly Bending[] {
  if (!way) return [];
  const past = [...way.obstacles, ...(rims?.obstacles ?? [])];
  const inBand = (bandHz: BandHz) => {
    const { [side]: round, rims: others } = waysIn(bandHz);
    return round && { round, others };
  };
  return [{ name: side, kind: side, past, way, lossDb: roundThenOverDb(inBand) }];
}

/** Round one of several that stand in the line of sight, then over whatever else stands in the line. */
function roundOne({ obstacle: { id }, round, others }: MixedWay, waysIn: WaysIn): Bending {
  const inBand = (bandHz: BandHz) =>
    waysIn(bandHz).mixed.find((way) => way.obstacle.id === id && way.round.kind === round.kind);
  return {
    name: `${round.kind}-of-${id}`,
    kind: round.kind === "left" ? "left-then-over" : "right-then-over",
    past: [id, ...(others?.obstacles ?? [])],
    way: round,
    lossDb: roundThenOverDb(inBand),
  };
}

type RoundThenOver = Pick<MixedWay, "round" | "others">;

function roundThenOverDb(inBand: (bandHz: BandHz) => RoundThenOver | undefined): Bending["lossDb"] {
  return (working, method, distanceM, groundDb, bandHz) => {
    const counting = inBand(bandHz);
    if (!counting) return NOT_COUNTED_DB;
    const roundDb = screenLossDb(working, counting.round, distanceM, bandHz);
    return roundDb + overLossDb(working.at("then:over"), method, counting.others, distanceM, groundDb, bandHz);
  };
}

/** Through a screen, then over whatever else stands in the line. */
function through(id: string, way: Way | undefined, waysIn: WaysIn): Bending {
  return {
    name: `through-${id}`,
    kind: "through",
    past: [id, ...(way?.obstacles ?? [])],
    way,
    lossDb: (working, method, distanceM, groundDb, bandHz) => {
      const counting = waysIn(bandHz).through.find(({ obstacle }) => obstacle.id === id);
      if (!counting) return NOT_COUNTED_DB;
      const panelDb = counting.obstacle.throughDb?.[bandHz] ?? 0;
      return panelDb + overLossDb(working, method, counting.others, distanceM, groundDb, bandHz);
    },
  };
}

function overLossDb(
  working: Working,
  method: Method,
  way: Way | undefined,
  distanceM: number,
  groundDb: number,
  bandHz: BandHz,
): number {
  if (!way) return 0;
  const diffractionDb = screenLossDb(working, way, distanceM, bandHz);
  const overTop = method.screenOverHardGround === "literal" ? screenOverTopLiteral : screenOverTop;
  return working.work(overTop, { diffractionDb, groundDb }, "screen");
}
