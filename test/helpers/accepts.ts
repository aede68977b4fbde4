import type { Equation } from "../../compute/equations/equation.ts";
import { InputError } from "../../compute/equations/input-error.ts";
import type { AnyInputs } from "./valid-inputs.ts";

/** Whether an equation takes these inputs; anything but a refusal is thrown on. */
export function accepts(equation: Equation, inputs: AnyInputs): boolean {
  try {
    equation.of(inputs as never);
    return true;
  } catch (error) {
    if (error instanceof InputError) return false;
    throw error;
  }
}
