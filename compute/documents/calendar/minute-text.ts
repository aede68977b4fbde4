const DAYS = ["mon", "tue", "wed", "thu", "fri", "sat", "sun"];

/** A minute of the week in words: `sat 13:00`. */
export function minuteText(minute: number): string {
  const two = (value: number) => String(value).padStart(2, "0");
  return `${DAYS[Math.floor(minute / 1440)]} ${two(Math.floor((minute % 1440) / 60))}:${two(minute % 60)}`;
}
