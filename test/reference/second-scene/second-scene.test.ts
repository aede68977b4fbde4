import path from "node:path";
import { holdAgainstHandWork } from "../hand-scene.ts";

// [derived] Worked out by hand in second-scene.md from ISO 9613-1, ISO 9613-2:1996 and Hopkins (4.92); nothing in expected.json comes
// from the program.
holdAgainstHandWork(path.dirname(new URL(import.meta.url).pathname), { figures: 50, terms: 12 });
