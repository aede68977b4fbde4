import { describe, expect, test } from "vitest";
import { silently } from "../../compute/equations/working.ts";
import { assess } from "../../compute/statement/assess.ts";
import { adoptedIds } from "../../compute/statement/control-sets.ts";
import { earProtection } from "../../compute/statement/zones-of.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";

// Alterations of the scene worked out by hand (worked-scene.md 11): edge 81.0309 dB(A); saw 106.635, enclosed pump 94.770, bare pump
// 112, breaker 111.347 dB(A).
const protection = (alter?: Parameters<typeof sceneInputs>[0]) => {
  const inputs = sceneInputs(alter);
  return earProtection(silently, inputs, assess(silently, inputs, adoptedIds(inputs)));
};
const zones = (alter?: Parameters<typeof sceneInputs>[0]) =>
  new Map(
    protection(alter).zones.map(({ item, zone }) => [
      item,
      zone.kind === "distance" ? Number(zone.distanceM.toFixed(2)) : zone.kind,
    ]),
  );
const beside = (item: string, alter?: Parameters<typeof sceneInputs>[0]) =>
  protection(alter).zones.find((each) => each.item === item)?.besideDba;

describe("what may run together", () => {
  test("machines whose activities never meet are not summed: the breaker stands alone", () => {
    // [derived] worked-scene.md 11: 26.104 m, 1 m beside it 109.365 dB(A).
    expect(zones().get("breaker")).toBe(26.1);
    expect(beside("breaker")).toBeCloseTo(109.365, 3);
  });
  test("machines of activities that meet on one afternoon are", () => {
    // [derived] Sum 1 m beside the pump with the saw 41.5 m off: 86.827 against 86.788 alone.
    expect(beside("pump")).toBeCloseTo(86.827, 3);
    const apart = (inputs: Parameters<NonNullable<Parameters<typeof sceneInputs>[0]>>[0]) => {
      for (const activity of inputs.statement.activities)
        if (activity.id === "pumping") for (const window of activity.windows) window.from = "18:00";
    };
    expect(beside("pump", apart)).toBeCloseTo(86.788, 3);
    expect(zones(apart).get("saw")).toBe(7.61);
  });
  test("items that cannot run together are judged alone, and by the others only the loudest of them counts", () => {
    // Pump and breaker in one activity that allows one at a time, beside the saw: with the saw counts the louder of the two, the
    // breaker (111.347 dB(A) against 94.770).
    const one = (kind: "may" | "cannot") => (inputs: Parameters<NonNullable<Parameters<typeof sceneInputs>[0]>>[0]) => {
      const [sawing, pumping, breaking] = inputs.statement.activities;
      if (!sawing || !pumping || !breaking) throw new Error("the scene has three activities");
      pumping.plant.push(...breaking.plant);
      pumping.runTogether = kind === "may" ? { kind } : { kind, why: { en: "One hose" } };
      inputs.statement.activities = [sawing, pumping];
    };
    // [derived] Beside the pump the saw counts and the breaker does not: 86.827 as before. May both run, the breaker adds to it.
    expect(beside("pump", one("cannot"))).toBeCloseTo(86.827, 3);
    expect(beside("pump", one("may")) ?? 0).toBeGreaterThan(86.9);
    expect(beside("saw", one("cannot")) ?? 0).toBeLessThan(beside("saw", one("may")) ?? 0);
    expect(beside("saw", one("cannot")) ?? 0).toBeGreaterThan(98.654);
  });
});

describe("an enclosure", () => {
  test("that the notice does not name as closed counts for nothing", () => {
    // [derived] Bare pump 112 dB(A): 104.018 at 1 m, with the saw at 41.5 m (66.292) 104.019.
    const unnamed = (inputs: Parameters<NonNullable<Parameters<typeof sceneInputs>[0]>>[0]) => {
      for (const control of inputs.statement.controls)
        if (control.kind === "enclosure") control.namedClosedOnNotice = false;
    };
    expect(beside("pump", unnamed)).toBeCloseTo(104.019, 3);
  });
});

describe("uncertainty", () => {
  test("is the largest of all levels at work, the work station's too, and never under 3 dB", () => {
    expect(protection().shift.uncertaintyDb).toBe(3);
    const loose = protection(({ plant }) => {
      for (const sheet of Object.values(plant)) if (sheet.workStation) sheet.workStation.uncertaintyDb = 5;
    });
    expect(loose.shift.uncertaintyDb).toBe(5);
    // [derived] 85 − 0.9691 − 5.
    expect(loose.edgeDba).toBeCloseTo(79.0309, 4);
    const lender = protection(({ plant }) => {
      for (const [id, sheet] of Object.entries(plant)) if (id === "diesel-set") sheet.emission.uncertaintyDb = 9;
    });
    expect(lender.shift.uncertaintyDb).toBe(3);
  });
});

describe("setting and walls", () => {
  test("a trench has no distance", () => {
    const trench = zones(({ statement }) => {
      for (const { plant } of statement.activities)
        for (const item of plant) if (item.id === "breaker") item.setting = { kind: "trench", name: { en: "Pit" } };
    });
    expect(trench.get("breaker")).toBe("whole-space");
  });
  test("without the sack store and the screen the breaker reaches 13.08 m, with the store alone 18.48 m", () => {
    const bare = zones(({ project, statement }) => {
      project.buildings = project.buildings.filter(({ id }) => id !== "sack-store");
      statement.controls = statement.controls.filter(({ id }) => id !== "north-screen");
    });
    expect(bare.get("breaker")).toBe(13.08);
    const store = zones(({ statement }) => {
      statement.controls = statement.controls.filter(({ id }) => id !== "north-screen");
    });
    expect(store.get("breaker")).toBe(18.48);
  });
});
