import type { SealedReason } from "../../compute/documents/types/revision.gen.ts";
import { tenthDb, zoneMetres } from "../../compute/figures/display.ts";
import { hrefTo } from "./page.ts";
import type { RevisionView } from "./revision-view.ts";
import { itemOf } from "./revision-view.ts";

/** Whether the ear-protection notice stands on a page. A required union: a page without it does not build. */
export type EarNotice =
  | {
      readonly kind: "mandatory";
      readonly title: string;
      readonly sign: string;
      readonly lead: string;
      readonly where: string;
      readonly reason: string;
      readonly href: string;
      readonly more: string;
    }
  | {
      readonly kind: "information";
      readonly title: string;
      readonly lead: string;
      readonly reason: string;
      readonly href: string;
      readonly more: string;
    }
  | { readonly kind: "none"; readonly reason: string };

/** The notice of a revision as its pages carry it; nothing but the sealed rule's result decides. */
export function earNotice(view: RevisionView, file: string): EarNotice {
  const { notice } = view.revision.earProtection;
  const { words } = view;
  const link = { href: hrefTo(file, `${view.folder}ear-protection/index.html`), more: words.say("notice.more") };
  switch (notice.kind) {
    case "mandatory":
      return {
        kind: "mandatory",
        title: words.say("notice.mandatory-title"),
        sign: words.say("notice.sign"),
        lead: words.say(notice.by === "law" ? "notice.mandatory-lead" : "notice.good-practice-lead", {
          zone: zoneTerm(view),
        }),
        where: whereText(view),
        reason: loudestReason(view),
        ...link,
      };
    case "information":
      return {
        kind: "information",
        title: words.say("notice.information-title"),
        lead: words.say("notice.information-lead"),
        reason: loudestReason(view),
        ...link,
      };
    case "none":
      return { kind: "none", reason: words.say("notice.none-reason") };
  }
}

/** The law's own term for the zone. */
export function zoneTerm(view: RevisionView): string {
  const set = view.revision.inputs.duties[view.revision.earProtection.dutySet];
  if (!set) throw new Error(`the revision has no duty set "${view.revision.earProtection.dutySet}"`);
  return view.text(set.zoneTerm);
}

/** In one sentence: how far to keep from what, or the whole work area. */
function whereText(view: RevisionView): string {
  const { zones } = view.revision.earProtection;
  const parts = zones.flatMap(({ item, activity, zone }) => {
    const name = view.text(itemOf(view, item).name);
    switch (zone.kind) {
      case "distance":
        return view.words.say("notice.where-distance", { name, metres: zoneMetres(zone.distanceM) });
      case "whole-space":
        return view.words.say("notice.where-space", { name });
      case "peak-not-known":
        return view.words.say("notice.where-area", { name, activity: activityTitle(view, activity) });
      default:
        return [];
    }
  });
  return view.words.say("notice.where", { list: parts.join("; ") });
}

function activityTitle(view: RevisionView, id: string): string {
  const activity = view.statement.activities.find((each) => each.id === id);
  if (!activity) throw new Error(`the statement has no activity "${id}"`);
  return view.text(activity.title);
}

/** Why the notice stands: loud places, and peaks that nobody has measured. */
export function reasonText(view: RevisionView): string {
  const { notice } = view.revision.earProtection;
  if (notice.kind === "none") return view.words.say("notice.none-reason");
  return notice.reasons.map((reason) => reasonSentence(view, reason)).join(" ");
}

/** The strongest reasons only: the loudest place, and a peak that nobody has measured. The notice's own page gives them all. */
function loudestReason(view: RevisionView): string {
  const { notice } = view.revision.earProtection;
  const loudness = (reason: SealedReason) => ("levelDba" in reason ? reason.levelDba : Number.NEGATIVE_INFINITY);
  const [loudest] = [...notice.reasons].sort((a, b) => loudness(b) - loudness(a));
  const unknown = notice.reasons.find(({ kind }) => kind === "peak-not-known");
  const shown = loudest === unknown ? [loudest] : [loudest, unknown];
  return shown.flatMap((reason) => (reason ? reasonSentence(view, reason) : [])).join(" ");
}

function reasonSentence(view: RevisionView, reason: SealedReason): string {
  const name = view.text(itemOf(view, reason.machine).name);
  switch (reason.kind) {
    case "beside":
    case "work-station":
      return view.words.say(`notice.reason-${reason.kind}`, { name, level: tenthDb(reason.levelDba) });
    case "peak":
      return view.words.say("notice.reason-peak", { name, level: tenthDb(reason.levelDbc) });
    case "peak-not-known":
      return view.words.say("notice.reason-peak-not-known", { name });
  }
}
