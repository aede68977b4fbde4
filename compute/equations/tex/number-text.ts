/** A number as it is printed: a plain decimal, or one times a power of ten. */
export interface NumberText {
  readonly digits: string;
  readonly exponent?: number;
}

/** Units whose values are printed as plain decimals, however small. */
const plainUnits: readonly string[] = ["dB", "dB/km", "%", "°C", "°", "Hz"];
const unitDecimals: Readonly<Record<string, number>> = {
  Hz: 0,
  "°C": 0,
  "%": 0,
  "°": 0,
  "1": 2,
  "m/s": 1,
  "kg/m²": 1,
  kPa: 2,
};

/** Decimals a unit is shown with where nothing else is said. */
export function decimalsOf(unit: string, decimals: number | undefined): number {
  return decimals ?? unitDecimals[unit] ?? 1;
}

/** The number printed stands for this. */
export function numberOf(text: NumberText): number {
  return Number(text.exponent === undefined ? text.digits : `${text.digits}e${text.exponent}`);
}

/**
 * Rounds to `decimals`. Unless their unit is a plain one, small values keep two significant digits, and very small
 * ones get a power of ten, as do very large ones.
 */
export function fixedText(value: number, decimals: number, unit: string): NumberText {
  const size = Math.abs(value);
  const free = size > 0 && !plainUnits.includes(unit);
  if (size >= 1e7 || (free && size < 1e-3)) return powerText(value, Math.max(1, decimals));
  const digits = value.toFixed(free ? Math.max(decimals, 1 - Math.floor(Math.log10(size))) : decimals);
  return { digits: Number(digits) === 0 ? digits.replace("-", "") : digits };
}

/** As `fixedText`, without the zeros that say nothing, down to `base` decimals. */
export function inputText(value: number, base: number, more: number, unit: string): NumberText {
  const text = fixedText(value, base + more, unit);
  return { ...text, digits: trimmed(text.digits, base) };
}

/** Rounds to significant digits, never coarser than whole units, and drops the zeros that say nothing. */
export function significantText(value: number, digits: number): NumberText {
  if (value === 0) return { digits: "0" };
  const size = Math.abs(value);
  if (size >= 1e7 || size < 1e-3) return powerText(value, digits - 1);
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(size)));
  return { digits: trimmed(value.toFixed(decimals), 0) };
}

/** Every digit of the number. */
export function exactText(value: number): NumberText {
  const size = Math.abs(value);
  if (value === 0 || (size >= 1e-3 && size < 1e7)) return { digits: String(value === 0 ? 0 : value) };
  const [digits, exponent] = value.toExponential().split("e");
  return { digits: digits as string, exponent: Number(exponent) };
}

function powerText(value: number, decimals: number): NumberText {
  const [digits, exponent] = value.toExponential(Math.min(decimals, 16)).split("e");
  return { digits: trimmed(digits as string, 1), exponent: Number(exponent) };
}

function trimmed(digits: string, keep: number): string {
  const [whole, decimals = ""] = digits.split(".");
  const kept = decimals.slice(0, keep) + decimals.slice(keep).replace(/0+$/, "");
  return kept === "" ? (whole as string) : `${whole}.${kept}`;
}
