import type { Working } from "../equations/working.ts";
import type { Exchange, Shift } from "./edge-level.ts";
import { GOOD_PRACTICE_DBA, goodPracticeCounts, valueEdgeDba } from "./edge-level.ts";
import type { Comparator, Peak } from "./peak.ts";
import { meets, peakMeets } from "./peak.ts";

/** Level and peak from which a duty set asks for something. */
export interface ActionValue {
  readonly levelDba: number | undefined;
  readonly comparator: Comparator;
  readonly peakDbc: number | undefined;
  readonly peakComparator: Comparator;
}

/** What the notice rule reads of a duty set. */
export interface Duty {
  readonly exchange: Exchange;
  readonly mandatoryFrom: ActionValue;
  readonly informationFrom: ActionValue;
}

/** What may be at the ear of someone at a machine. */
export interface Place {
  readonly machine: string;
  /** Sum of all machines 1 m outside its outline and swing [dB(A)]. */
  readonly besideDba: number;
  readonly workStationDba: number | undefined;
  readonly peak: Peak | undefined;
  readonly impulsive: boolean;
}

export type Reason =
  | { readonly kind: "beside" | "work-station"; readonly machine: string; readonly levelDba: number }
  | { readonly kind: "peak"; readonly machine: string; readonly levelDbc: number }
  | { readonly kind: "peak-not-known"; readonly machine: string };

/** Whether a notice stands; a required union, so that no page can forget it. */
export type Notice =
  /** `by` says whether the law's own value is met or only 85 dB(A) as good practice. */
  | { readonly kind: "mandatory"; readonly by: "law" | "good-practice"; readonly reasons: readonly Reason[] }
  | { readonly kind: "information"; readonly reasons: readonly Reason[] }
  | { readonly kind: "none"; readonly reasons: readonly [] };

/**
 * Whether the ear-protection notice stands, by the one rule: for any place beside a machine for the whole shift, or at its
 * work station, level + U meets the value, or peak data meet it, or impulsive plant has no peak data.
 *
 * @param working  what works the equations out
 * @param duty     values of the duty set and its exchange of level against time
 * @param places   every machine of the phase
 * @param shift    length of the shift and U
 */
export function notice(working: Working, duty: Duty, places: readonly Place[], shift: Shift): Notice {
  const { exchange, mandatoryFrom, informationFrom } = duty;
  const edgeOf = (value: ActionValue) =>
    value.levelDba === undefined ? undefined : valueEdgeDba(working, value.levelDba, exchange, shift);
  const unknown = places
    .filter((place) => place.impulsive && !place.peak)
    .map((place) => ({ kind: "peak-not-known", machine: place.machine }) as const);
  const law = [...reasonsFor(working, places, mandatoryFrom, edgeOf(mandatoryFrom)), ...unknown];
  if (law.length > 0) return { kind: "mandatory", by: "law", reasons: law };
  if (goodPracticeCounts(mandatoryFrom.levelDba)) {
    const edgeDba = valueEdgeDba(working, GOOD_PRACTICE_DBA, { kind: "equal-energy" }, shift);
    const practice = places.flatMap((place) => levelReasons(place, edgeDba, "at-or-above"));
    if (practice.length > 0) return { kind: "mandatory", by: "good-practice", reasons: practice };
  }
  const information = reasonsFor(working, places, informationFrom, edgeOf(informationFrom));
  return information.length > 0 ? { kind: "information", reasons: information } : { kind: "none", reasons: [] };
}

function reasonsFor(
  working: Working,
  places: readonly Place[],
  value: ActionValue,
  edgeDba: number | undefined,
): readonly Reason[] {
  return places.flatMap((place) => [
    ...(edgeDba === undefined ? [] : levelReasons(place, edgeDba, value.comparator)),
    ...peakReasons(working, place, value),
  ]);
}

function levelReasons(place: Place, edgeDba: number, comparator: Comparator): readonly Reason[] {
  const { machine, besideDba, workStationDba } = place;
  return [
    ...(meets(besideDba, edgeDba, comparator) ? [{ kind: "beside", machine, levelDba: besideDba } as const] : []),
    ...(workStationDba !== undefined && meets(workStationDba, edgeDba, comparator)
      ? [{ kind: "work-station", machine, levelDba: workStationDba } as const]
      : []),
  ];
}

function peakReasons(working: Working, { peak, machine }: Place, value: ActionValue): readonly Reason[] {
  if (!peak || value.peakDbc === undefined) return [];
  const reached = peakMeets(working.at(`machine:${machine}`), peak, value.peakDbc, value.peakComparator);
  return reached ? [{ kind: "peak", machine, levelDbc: peak.levelDbc }] : [];
}
