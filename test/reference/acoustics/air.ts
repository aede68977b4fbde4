import { equations } from "../../../compute/equations/registry.ts";
import { intermediate } from "../intermediate.ts";
import { exactMidband } from "../midbands.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

interface Air {
  readonly t_C: number;
  readonly RH_pct: number;
  readonly pa_kPa: number;
}
const absorption = ({ t_C, RH_pct, pa_kPa }: Air) => {
  return (frequencyHz: number) =>
    equations["air-absorption"].of({ frequencyHz, temperatureC: t_C, humidityPct: RH_pct, pressureKpa: pa_kPa });
};
const part = (name: string, temperatureC: number, humidityPct: number) =>
  intermediate("air-absorption", name, { temperatureC, humidityPct, pressureKpa: 101.325 });

const climates = ["10-70", "20-70", "30-70", "15-20", "15-50", "15-80"];
const scattered = [
  ...["-20-10-50", "-20-50-1000", "-20-70-8000", "-20-100-10000", "0-10-50", "0-50-1000", "0-20-2000", "0-100-6300"],
  ...["5-50-1000", "10-70-1000", "10-50-4000", "15-50-1000", "15-100-10000", "20-50-1000", "20-50-2000", "25-50-1000"],
  ...["25-100-2000", "30-50-1000", "30-50-4000", "35-50-1000", "40-50-1000", "45-50-800", "50-50-2000"],
];

export const airRows: readonly RowGroup[] = [
  tested<{ T_K: number }>({
    ids: ["atm-psat20"],
    equations: [],
    against: "ISO 9613-1:1993, (B.2) and (B.3)",
    note: "C as it stands in the TeX of air-absorption",
    tolerance: { value: 0.000005, reason: "2.33663 kPa is printed with five decimals; the row's 1e-7 overstates it" },
    work: ({ T_K }) => 101.325 * 10 ** part("C", T_K - 273.15, 50),
  }),
  leftOut("the speed of sound is no equation here: screens use λ = 340/f as ISO 9613-2 does", ["atm-c20"]),
  tested<{ T_K: number; h_pct: number }>({
    ids: ["atm-dry-relax"],
    equations: [],
    against: "ISO 9613-1:1993, eqs. (3) and (4)",
    note: "dry air lies outside the range of the equation: its TeX is read without the range",
    work: ({ T_K, h_pct }) => [part("f_rO", T_K - 273.15, h_pct), part("f_rN", T_K - 273.15, h_pct)],
  }),
  tested<Air>({
    ids: ["atm-h-20-50"],
    equations: [],
    against: "ISO 9613-1:1993, (B.1)",
    work: ({ t_C, RH_pct }) => part("h", t_C, RH_pct),
  }),
  tested<Air>({
    ids: ["atm-relax-20-50"],
    equations: [],
    against: "ISO 9613-1:1993, eqs. (3) and (4)",
    work: ({ t_C, RH_pct }) => [part("f_rO", t_C, RH_pct), part("f_rN", t_C, RH_pct)],
  }),
  tested<Air & { bands_Hz: number[] }>({
    ids: climates.map((climate) => `atm-t2-${climate}`),
    equations: ["air-absorption"],
    against: "ISO 9613-2:1996, Table 2",
    note: "exact midbands; the printed 4.1 dB/km at 15 °C, 80 %, 1 kHz is 0.001 beyond half a digit: 4.151",
    work: ({ bands_Hz, ...air }) => bands_Hz.map(exactMidband).map(absorption(air)),
  }),
  tested<Air & { bands_Hz: number[] }>({
    ids: climates.map((climate) => `atm-calc-${climate}`),
    equations: ["air-absorption"],
    against: "ISO 9613-1:1993, worked apart",
    work: ({ bands_Hz, ...air }) => bands_Hz.map(absorption(air)),
  }),
  tested<Air & { nominal_Hz: number }>({
    ids: scattered.map((row) => `atm-t1-${row}`),
    equations: ["air-absorption"],
    against: "ISO 9613-1:1993, Table 1",
    work: ({ nominal_Hz, ...air }) => absorption(air)(exactMidband(nominal_Hz)),
  }),
  tested<Air & { nominal_Hz: number[] }>({
    ids: ["atm-t1row--20-10", "atm-t1row--15-30", "atm-t1row-25-80"],
    equations: ["air-absorption"],
    against: "ISO 9613-1:1993, Table 1",
    work: ({ nominal_Hz, ...air }) => nominal_Hz.map(exactMidband).map(absorption(air)),
  }),
  tested<Air & { bands_Hz: number[] }>({
    ids: ["atm-eia-1.1-100"],
    equations: ["air-absorption"],
    against: "a published environmental statement, at nominal frequencies",
    work: ({ bands_Hz, ...air }) => bands_Hz.map(absorption(air)),
  }),
];
