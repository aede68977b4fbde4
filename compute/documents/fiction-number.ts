interface Range {
  readonly country: string;
  /** Digits in national form, trunk prefix and all. */
  readonly pattern: RegExp;
}

/**
 * Numbers set aside for films and plays, which reach nobody.
 * [memory] Ofcom "Telephone numbers for drama use"; 555-0100 to 555-0199 of the North American plan; numbers of the
 * Australian regulator for radio, film and television; ARCEP for France; Bundesnetzagentur for Germany; PTS for Sweden.
 */
const RANGES: readonly Range[] = [
  { country: "44", pattern: /^01(1[3-8]|21|31|41|51|61)4960\d{3}$/ },
  { country: "44", pattern: /^01914980\d{3}$/ },
  { country: "44", pattern: /^02079460\d{3}$/ },
  { country: "44", pattern: /^028(9018|9649)\d{4}$/ },
  { country: "44", pattern: /^02920180\d{3}$/ },
  { country: "44", pattern: /^01632960\d{3}$/ },
  { country: "44", pattern: /^07700900\d{3}$/ },
  { country: "44", pattern: /^08081570\d{3}$/ },
  { country: "44", pattern: /^09098790\d{3}$/ },
  { country: "44", pattern: /^03069990\d{3}$/ },
  { country: "1", pattern: /^[2-9]\d{2}55501\d{2}$/ },
  { country: "61", pattern: /^0?[2378]?(5550|7010)\d{4}$/ },
  { country: "61", pattern: /^0491570(006|156|157|158|159|110|313|737)$/ },
  { country: "61", pattern: /^1(800160401|[38]009757\d{2})$/ },
  { country: "33", pattern: /^0(19900|26191|35301|46571|53649|63998)\d{4}$/ },
  { country: "49", pattern: /^0(3023125|6990009|4066969|2214710|8999998)\d{2,3}$/ },
  { country: "46", pattern: /^0(3139006|4062804|8465004|9803192|7017406)\d{2}$/ },
];

/** Whether a telephone number lies in a range set aside for fiction; without a country code every country's range counts. */
export function isFictionNumber(telephone: string): boolean {
  const international = telephone
    .replace(/^\s*00/, "+")
    .trim()
    .startsWith("+");
  const digits = telephone.replace(/^\s*00/, "").replace(/\D/g, "");
  return RANGES.some(({ country, pattern }) => {
    if (!international) return pattern.test(digits) || pattern.test(digits.replace(/^1/, ""));
    if (!digits.startsWith(country)) return false;
    const rest = digits.slice(country.length).replace(/^0/, "");
    return pattern.test(rest) || pattern.test(`0${rest}`);
  });
}
