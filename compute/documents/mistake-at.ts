import { findNodeAtLocation, type Node, parseTree } from "jsonc-parser";
import type { Mistake } from "./mistake.ts";
import { pointerSegments } from "./pointer-segments.ts";
import { positionAt } from "./position-at.ts";

/**
 * A mistake with its line and column.
 *
 * @param texts     file texts by path
 * @param file      path as in `texts`; a file that is not there gives line 1, column 1
 * @param pointer   JSON pointer of the value; where it leads to nothing, the nearest thing above it gives the place
 * @param expected  what would have been accepted, with unit and range
 * @param received  what was given, ready to print: see `receivedText`
 * @param advice    what to do, a sentence, or nothing
 * @param place     whether the place is that of the value or of the name of its field
 */
export function mistakeAt(
  texts: ReadonlyMap<string, string>,
  file: string,
  pointer: string,
  expected: string,
  received: string,
  advice = "",
  place: "value" | "name" = "value",
): Mistake {
  const text = texts.get(file) ?? "";
  const root = parseTree(text);
  const node = root && nearestNode(root, pointer);
  const shown = place === "name" && node?.parent?.type === "property" ? node.parent : node;
  return { file, ...positionAt(text, shown?.offset ?? 0), pointer, expected, received, advice };
}

function nearestNode(root: Node, pointer: string): Node {
  let node = root;
  for (const segment of pointerSegments(pointer)) {
    const next = findNodeAtLocation(node, [node.type === "array" ? Number(segment) : segment]);
    if (!next) break;
    node = next;
  }
  return node;
}
