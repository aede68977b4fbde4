/** What a figure is about; together its parts are the figure's key. */
export interface FigureParts {
  /** level, limit, exceedance, insertion-loss, beside-level, zone-edge, zone-distance */
  readonly quantity: string;
  /** LAeq, LAeq-15min, LEX8h … */
  readonly metric: string;
  /** Receptor point `<receptor>.<point>` or plant item. */
  readonly subject: string;
  /** `<limit set>.<rule>`, `window` (the activity's own) or `shift`. */
  readonly period: string;
  /** `phase` or an activity. */
  readonly scope: string;
  /** `all`, `none` or one control: what is in place, or whose insertion loss it is. */
  readonly controls: string;
}

/** A number that is published. */
export interface Figure extends FigureParts {
  readonly key: string;
  /** Unrounded. */
  readonly value: number;
  readonly unit: string;
}

const PART = /^[A-Za-z0-9][A-Za-z0-9.-]*$/;

/** The key of a figure: anchor on the page, row key of its data files, what comparisons match on. */
export function figureKey(parts: FigureParts): string {
  const ordered = [parts.quantity, parts.metric, parts.subject, parts.period, parts.scope, parts.controls];
  const wrong = ordered.find((part) => !PART.test(part));
  if (wrong !== undefined) throw new Error(`"${wrong}" cannot be part of a figure key`);
  return ordered.join("/");
}

/** A figure with its key. */
export function figure(parts: FigureParts, value: number, unit: string): Figure {
  if (!Number.isFinite(value)) throw new Error(`${figureKey(parts)}: the value is not a finite number (${value})`);
  return { key: figureKey(parts), ...parts, value, unit };
}

/** The parts of a key, or nothing if it is not one. */
export function partsOf(key: string): FigureParts | undefined {
  const [quantity, metric, subject, period, scope, controls, more] = key.split("/");
  if (!quantity || !metric || !subject || !period || !scope || !controls || more !== undefined) return undefined;
  return { quantity, metric, subject, period, scope, controls };
}
