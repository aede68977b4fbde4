import { equation } from "../equation.ts";

/**
 * Pure-tone attenuation coefficient at the frequency as given: no snapping to midbands.
 * The factor 1000 turns the standard's dB/m into dB/km.
 */
export const airAbsorption = equation({
  id: "air-absorption",
  title: "atmospheric attenuation coefficient",
  version: 1,
  tex: String.raw`\begin{aligned}
\alpha &= 1000 \cdot 8.686 f^2 \left( 1.84 \cdot 10^{-11} \left(\frac{p_{\text{a}}}{p_{\text{r}}}\right)^{-1} \left(\frac{T}{T_0}\right)^{1/2} + \left(\frac{T}{T_0}\right)^{-5/2} \left( 0.01275 \exp\left(\frac{-2239.1}{T}\right) \left(f_{\text{rO}} + \frac{f^2}{f_{\text{rO}}}\right)^{-1} + 0.1068 \exp\left(\frac{-3352.0}{T}\right) \left(f_{\text{rN}} + \frac{f^2}{f_{\text{rN}}}\right)^{-1} \right) \right) \\
f_{\text{rO}} &= \frac{p_{\text{a}}}{p_{\text{r}}} \left( 24 + 4.04 \cdot 10^{4} h \frac{0.02 + h}{0.391 + h} \right) \\
f_{\text{rN}} &= \frac{p_{\text{a}}}{p_{\text{r}}} \left(\frac{T}{T_0}\right)^{-1/2} \left( 9 + 280 h \exp\left( -4.170 \left( \left(\frac{T}{T_0}\right)^{-1/3} - 1 \right) \right) \right) \\
h &= h_{\text{r}} 10^{C} \left(\frac{p_{\text{a}}}{p_{\text{r}}}\right)^{-1} \\
C &= -6.8346 \left(\frac{T_{01}}{T}\right)^{1.261} + 4.6151 \\
T &= t + 273.15 \\
T_0 &= 293.15 \\
T_{01} &= 273.16 \\
p_{\text{r}} &= 101.325
\end{aligned}`,
  value: { symbol: String.raw`\alpha`, unit: "dB/km" },
  inputs: {
    frequencyHz: { kind: "one", symbol: "f", unit: "Hz", min: 50, max: 10000 },
    temperatureC: { kind: "one", symbol: "t", unit: "°C", min: -20, max: 50 },
    humidityPct: { kind: "one", symbol: String.raw`h_{\text{r}}`, unit: "%", min: 10, max: 100 },
    pressureKpa: { kind: "one", symbol: String.raw`p_{\text{a}}`, unit: "kPa", min: 50, max: 200, decimals: 3 },
  },
  source: {
    document: "ISO 9613-1",
    edition: "1993",
    clause: "6, eqs. (3) to (5); Annex B, eqs. (B.1) to (B.3)",
    checked: "read-secondary",
  },
  work: ({ frequencyHz, temperatureC, humidityPct, pressureKpa }) => {
    const pressure = pressureKpa / 101.325;
    const temperatureK = temperatureC + 273.15;
    const warmth = temperatureK / 293.15;
    const molarPct = (humidityPct * 10 ** (-6.8346 * (273.16 / temperatureK) ** 1.261 + 4.6151)) / pressure; // (B.1) to (B.3)
    const oxygenHz = pressure * (24 + (4.04e4 * molarPct * (0.02 + molarPct)) / (0.391 + molarPct)); // (3)
    const nitrogenHz =
      (pressure / Math.sqrt(warmth)) * (9 + 280 * molarPct * Math.exp(-4.17 * (warmth ** (-1 / 3) - 1))); // (4)
    const f2 = frequencyHz ** 2;
    const oxygen = (0.01275 * Math.exp(-2239.1 / temperatureK)) / (oxygenHz + f2 / oxygenHz);
    const nitrogen = (0.1068 * Math.exp(-3352 / temperatureK)) / (nitrogenHz + f2 / nitrogenHz);
    return 8686 * f2 * ((1.84e-11 / pressure) * Math.sqrt(warmth) + warmth ** -2.5 * (oxygen + nitrogen)); // (5)
  },
});
