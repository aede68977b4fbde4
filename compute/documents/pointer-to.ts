/** The pointer one step further down (RFC 6901). */
export function pointerTo(pointer: string, ...steps: readonly (string | number)[]): string {
  return pointer + steps.map((step) => `/${String(step).replaceAll("~", "~0").replaceAll("/", "~1")}`).join("");
}
