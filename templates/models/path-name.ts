import type { SealedPath } from "../../compute/documents/types/revision.gen.ts";
import { decimals } from "../../compute/figures/display.ts";
import { listText } from "./dates.ts";
import type { RevisionView } from "./revision-view.ts";

/** What a path is called: straight, over, round an end of, through or reflected by what it passes, with its path-length difference. */
export function pathName(view: RevisionView, path: SealedPath): string {
  const [first, ...others] = path.past;
  const past = (ids: readonly string[]) =>
    listText(
      view.words,
      ids.map((id) => obstacleName(view, id)),
    );
  const z =
    path.pathDifferenceM === undefined ? "" : view.words.say("terms.path-z", { z: decimals(path.pathDifferenceM, 3) });
  switch (path.kind) {
    case "direct":
      return view.words.say("terms.path-direct");
    case "through":
    case "reflected": {
      const over = others.length > 0 ? view.words.say("terms.path-then-over", { past: past(others) }) : "";
      return view.words.say(`terms.path-${path.kind}`, { past: first ? obstacleName(view, first) : "", over, z });
    }
    case "left-then-over":
    case "right-then-over": {
      const over = others.length > 0 ? view.words.say("terms.path-then-over", { past: past(others) }) : "";
      const kind = path.kind === "left-then-over" ? "left" : "right";
      return view.words.say(`terms.path-${kind}`, { past: `${first ? obstacleName(view, first) : ""}${over}`, z });
    }
    case "over":
      return view.words.say("terms.path-over", { past: past(path.past), z });
    default: {
      // What goes round the rest bends over the rims of excavations.
      const rims = path.past.filter((id) => view.project.excavations.some((excavation) => excavation.id === id));
      const over = rims.length > 0 ? view.words.say("terms.path-then-over", { past: past(rims) }) : "";
      const beside = past(path.past.filter((id) => !rims.includes(id)));
      return view.words.say(`terms.path-${path.kind}`, { past: `${beside}${over}`, z });
    }
  }
}

/** Name of a control, building or excavation. */
function obstacleName(view: RevisionView, id: string): string {
  const all = [...view.statement.controls, ...view.project.buildings, ...view.project.excavations];
  const found = all.find((each) => each.id === id);
  if (!found) throw new Error(`the revision has nothing "${id}" that sound could pass`);
  return view.text(found.name);
}
