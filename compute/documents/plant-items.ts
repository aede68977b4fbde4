import type { Activity, PlantItem, Statement } from "./types/statement.gen.ts";

/** A plant item of a statement with its activity and its pointer. */
export interface PlacedItem {
  readonly item: PlantItem;
  readonly activity: Activity;
  readonly pointer: string;
}

/** All plant items of a statement. */
export function plantItems(statement: Statement): readonly PlacedItem[] {
  return statement.activities.flatMap((activity, a) =>
    activity.plant.map((item, p) => ({ item, activity, pointer: `/activities/${a}/plant/${p}` })),
  );
}
