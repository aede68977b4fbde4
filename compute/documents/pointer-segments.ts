/** The names and numbers a JSON pointer goes through (RFC 6901). */
export function pointerSegments(pointer: string): readonly string[] {
  if (pointer === "") return [];
  return pointer
    .slice(1)
    .split("/")
    .map((segment) => segment.replaceAll("~1", "/").replaceAll("~0", "~"));
}
