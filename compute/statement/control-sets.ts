import type { Control } from "../documents/types/statement.gen.ts";
import type { StatementInputs } from "./inputs.ts";

/** Controls the statement adopts, practice included. */
export function adopted(inputs: StatementInputs): readonly Control[] {
  return inputs.statement.controls.filter((control) => control.state.kind === "adopted");
}

/** Adopted controls whose effect is worked out: all but practice. */
export function computed(inputs: StatementInputs): readonly Control[] {
  return adopted(inputs).filter((control) => control.kind !== "practice");
}

/** Ids of the adopted controls, without one of them if asked for. */
export function adoptedIds(inputs: StatementInputs, without?: string): ReadonlySet<string> {
  return new Set(
    adopted(inputs)
      .map((control) => control.id)
      .filter((id) => id !== without),
  );
}

/** What the effect of a control is called: an insertion loss, or for less running time a reduction. */
export function effectOf(control: Control): "insertion-loss" | "reduction" {
  return control.kind === "running-time" ? "reduction" : "insertion-loss";
}
