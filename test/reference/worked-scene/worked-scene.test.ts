import path from "node:path";
import { holdAgainstHandWork } from "../hand-scene.ts";

// [derived] Worked out by hand in worked-scene.md from ISO 9613-1, ISO 9613-2:1996, Bies (7.103) and (7.111), Hopkins (4.92) and the
// rules for time shares and zones; nothing in expected.json comes from the program.
holdAgainstHandWork(path.dirname(new URL(import.meta.url).pathname), { figures: 75, terms: 6 });
