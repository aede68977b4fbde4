import { readFileSync } from "node:fs";
import type { Level } from "../../compute/documents/types/common.gen.ts";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";
import type { Wording } from "../../compute/documents/types/wording.gen.ts";
import { makeRevision } from "../../compute/record/make-revision.ts";
import type { StatementInputs } from "../../compute/statement/inputs.ts";
import { earProtectionPage } from "../../templates/models/ear-protection.ts";
import type { Page } from "../../templates/models/page.ts";
import type { Standing } from "../../templates/models/revision-view.ts";
import { revisionView } from "../../templates/models/revision-view.ts";
import { statementPage } from "../../templates/models/statement.ts";
import { workingsPage } from "../../templates/models/workings.ts";
import type { Writable } from "./scene-inputs.ts";

/** The words of the demo, which the worked scene's pages are printed with. */
export const pageWords = JSON.parse(readFileSync("content/wording/en.json", "utf8")) as Wording;

/** Equations as bare text: what they look like is not the matter here. */
export const bareTypesetter = { display: (tex: string) => tex, inline: (tex: string) => tex };

/** A revision of some inputs with the demo's words, or others. */
export function sceneRevision(inputs: StatementInputs, wording: Wording = pageWords): Revision {
  return makeRevision(inputs, { en: wording }, { number: 1, issuedOn: "2026-12-01", toolVersion: "0.0.0" });
}

/** Statement, workings and ear-protection page of a revision. */
export function scenePages(revision: Revision, standing: Standing = { kind: "in-force" }): readonly Page[] {
  const view = revisionView(revision, `${revision.project}/${revision.phase}/`, standing);
  return [statementPage(view), workingsPage(view, bareTypesetter), earProtectionPage(view)];
}

/** Takes the same number of decibels off every level of every plant sheet; bangs and their unknown peaks go too. */
export function quieten(inputs: Writable<StatementInputs>, byDb: number): void {
  for (const sheet of Object.values(inputs.plant)) {
    for (const level of [sheet.emission, sheet.workStation, sheet.peak] as (Writable<Level> | undefined)[]) {
      if (!level) continue;
      level.character.impulsive = false;
      if (level.kind === "single") level.valueDb -= byDb;
      else {
        const bands = level.bandsDb as unknown as Record<string, number>;
        for (const band of Object.keys(bands)) bands[band] = (bands[band] ?? Number.NaN) - byDb;
      }
    }
  }
}
