import { makeRevision } from "../../compute/record/make-revision.ts";
import type { Page } from "../../templates/models/page.ts";
import { siteOf } from "../../templates/models/site.ts";
import { demo } from "./demo-revisions.ts";
import { sceneInputs } from "./scene-inputs.ts";
import { pageWords, quieten, scenePages, sceneRevision } from "./site-scenes.ts";

/** Pages of every type and variant: the demo with a superseded revision, and scenes of the other notices and of a real site. */
export function variedPages(): readonly Page[] {
  const { drafts, content } = demo();
  const issue = (number: number, issuedOn: string) => ({ number, issuedOn, toolVersion: "0.0.0" });
  const phases = drafts.map(({ project, phase, inputs }) => {
    const first = makeRevision(inputs, { en: pageWords }, issue(1, "2026-12-01"));
    return { project, phase, revisions: [first, { ...first, ...issue(2, "2026-12-02") }] };
  });
  const { method } = content;
  const demoPages = siteOf({ phases, wording: pageWords, method, asOf: "2027-03-15" }).pages;
  const real = sceneInputs((inputs) => {
    quieten(inputs, 25);
    Object.assign(inputs.statement, { invented: false });
  });
  const scenes = [sceneInputs(), real, sceneInputs((inputs) => quieten(inputs, 60))];
  return [...demoPages, ...scenes.flatMap((inputs) => scenePages(sceneRevision(inputs)))];
}
