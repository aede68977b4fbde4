import { accuracy } from "./accuracy.ts";

/** The accuracy table of the README as Markdown. */
export function accuracyTable(): string {
  const rows = accuracy().map(
    ({ id, against, rows: count, largestDifference, unit }) =>
      `| \`${id}\` | ${against.join("; ")} | ${count} | ${differenceText(largestDifference, unit)} |`,
  );
  const total = accuracy().reduce((sum, { rows: count }) => sum + count, 0);
  const about = `${rows.length} equations, ${total} checks. Differences include the rounding of the printed tables.`;
  return [
    about,
    "",
    "| Equation | Checked against | Rows | Largest difference |",
    "| --- | --- | --- | --- |",
    ...rows,
  ].join("\n");
}

/** Two digits, and no digits that another machine's logarithm could change. */
function differenceText(difference: number, unit: string): string {
  const text = difference < 0.0001 ? "under 0.0001" : String(Number(difference.toPrecision(2)));
  return unit === "1" ? text : `${text} ${unit}`;
}
