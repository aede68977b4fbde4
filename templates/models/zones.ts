import type { SealedCrossing, SealedItemZone } from "../../compute/documents/types/revision.gen.ts";
import { tenthDb, zoneMetres } from "../../compute/figures/display.ts";
import { dateText, windowText } from "./dates.ts";
import type { RevisionView } from "./revision-view.ts";
import { itemOf } from "./revision-view.ts";

/** One machine's zone as pages print it. */
export interface ZoneRow {
  readonly key: string;
  readonly machine: string;
  readonly activity: string;
  readonly times: string;
  readonly mark: string;
  readonly beside: string;
  readonly notes: readonly string[];
}

/** Zones of all machines of a revision, in the order of the statement. */
export function zoneRows(view: RevisionView): readonly ZoneRow[] {
  return view.revision.earProtection.zones.map((each) => zoneRow(view, each));
}

function zoneRow(view: RevisionView, each: SealedItemZone): ZoneRow {
  const { words, text } = view;
  const activity = view.statement.activities.find(({ id }) => id === each.activity);
  if (!activity) throw new Error(`the statement has no activity "${each.activity}"`);
  return {
    key: `zone-distance/LAeq/${each.item}/shift/${each.activity}/all`,
    machine: text(itemOf(view, each.item).name),
    activity: text(activity.title),
    times: [
      words.say("statement.dates", { from: dateText(words, activity.from), until: dateText(words, activity.until) }),
      ...activity.windows.map((window) => windowText(words, window)),
    ].join("; "),
    mark: markText(view, each, text(activity.title)),
    beside: tenthDb(each.besideDba),
    notes: [...nearField(view, each), ...answersTo(view, each), ...closedEnclosures(view, each)],
  };
}

function markText(view: RevisionView, { zone, item }: SealedItemZone, activity: string): string {
  const { words } = view;
  switch (zone.kind) {
    case "distance":
      return words.say("zones.distance", { metres: zoneMetres(zone.distanceM) });
    case "inside-another":
      return words.say("zones.inside-another");
    case "whole-space":
      return words.say("zones.whole-space", { space: spaceName(view, item) });
    case "peak-not-known":
      return words.say("zones.peak-not-known", { activity });
    case "none":
      return words.say("zones.none");
  }
}

function spaceName(view: RevisionView, item: string): string {
  const { setting } = itemOf(view, item);
  return setting.kind === "open" ? "" : view.text(setting.name);
}

function nearField(view: RevisionView, { zone }: SealedItemZone): readonly string[] {
  return zone.kind === "distance" && zone.nearField ? [view.words.say("zones.near-field")] : [];
}

/** What keeps people out, or lowers the level, where the zone passes the boundary, a way or a receptor. */
function answersTo(view: RevisionView, { item, crossings }: SealedItemZone): readonly string[] {
  return crossings.flatMap((crossing) => {
    const answer = view.statement.zoneAnswers.find(
      ({ plant, crosses }) =>
        plant === item &&
        crosses.kind === crossing.kind &&
        (crosses.kind === "boundary" || ("id" in crossing && crosses.id === crossing.id)),
    );
    if (!answer) throw new Error(`the zone of "${item}" passes ${crossing.kind} without an answer`);
    return view.words.say(`zones.answer-${answer.answer.kind}`, {
      what: crossedName(view, crossing),
      how: view.text(answer.answer.how),
    });
  });
}

function crossedName(view: RevisionView, crossing: SealedCrossing): string {
  if (crossing.kind === "boundary") return view.words.say("zones.boundary");
  const list = crossing.kind === "public-way" ? view.project.publicWays : view.project.receptors;
  const found = list.find(({ id }) => id === crossing.id);
  if (!found) throw new Error(`the project has no ${crossing.kind} "${crossing.id}"`);
  return view.text(found.name);
}

/** An enclosure that the zone counts on must be named as closed wherever the zone is told. */
function closedEnclosures(view: RevisionView, { item }: SealedItemZone): readonly string[] {
  return view.statement.controls.flatMap((control) =>
    control.kind === "enclosure" &&
    control.state.kind === "adopted" &&
    control.namedClosedOnNotice &&
    control.appliesTo.includes(item)
      ? [view.words.say("zones.enclosure-closed", { name: view.text(control.name) })]
      : [],
  );
}
