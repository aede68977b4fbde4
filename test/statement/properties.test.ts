import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { silently } from "../../compute/equations/working.ts";
import { figuresOf } from "../../compute/statement/figures-of.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";

// What must hold whatever machine is added, from the sum of energies and the rules for shares of time.
const levelsOf = (inputs: ReturnType<typeof sceneInputs>) =>
  new Map(
    figuresOf(silently, inputs).figures.flatMap(({ key, quantity, controls, value }) =>
      quantity === "level" && ["all", "none"].includes(controls) ? [[key, value] as const] : [],
    ),
  );

describe("a machine that is added", () => {
  const before = levelsOf(sceneInputs());
  test("never lowers a level, wherever it stands and however long it runs", () => {
    const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 2 }),
        fc.constantFrom("floor-saw", "rock-breaker", "pit-pump"),
        number(1, 119),
        number(26, 59),
        fc.integer({ min: 1, max: 100 }),
        fc.boolean(),
        (activity, sheet, xM, yM, onTimePct, together) => {
          const inputs = sceneInputs(({ statement }) => {
            const busy = statement.activities[activity];
            if (!busy) throw new Error("the scene has three activities");
            if (!together) busy.runTogether = { kind: "cannot", why: { en: "One driver" } };
            busy.plant.push({
              id: "added",
              sheet,
              name: { en: "One more" },
              at: { xM, yM },
              bearingDeg: 0,
              onTimePct,
              setting: { kind: "open" },
            });
          });
          const after = levelsOf(inputs);
          expect([...after.keys()]).toEqual([...before.keys()]);
          for (const [key, level] of before) expect(after.get(key), key).toBeGreaterThanOrEqual(level - 1e-9);
        },
      ),
      { numRuns: 60, seed: 82 },
    );
  });
});
