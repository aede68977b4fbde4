import { makeRevision } from "../../compute/record/make-revision.ts";
import { ISSUE } from "./demo-revisions.ts";
import { sceneInputs } from "./scene-inputs.ts";

/** The scene worked out by hand by all that it leaves out: reflections, the alternative ground method, C0. */
export function otherMethodRevision() {
  const inputs = sceneInputs(({ project }) => {
    Object.assign(project.method, { ground: "alternative", reflections: "first-order", c0Db: 2 });
    for (const building of project.buildings) building.walls = "with-windows";
  });
  return makeRevision(
    inputs,
    { en: { language: "en", sections: { common: { invented: "Invented example" } } } },
    ISSUE,
  );
}
