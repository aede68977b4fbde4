/** A unit as TeX; nothing for a bare number. */
export function unitTex(unit: string): string {
  if (unit === "1") return "";
  const [base, ...rest] = unit.split("²");
  const degrees = unit.startsWith("°") ? String.raw`^\circ` : "";
  const letters = (base ?? "").replace("°", "");
  const text = letters === "" ? "" : String.raw`\text{${letters}}`;
  return `${degrees}${text}${rest.length > 0 ? "^2" : ""}`;
}
