import { equation } from "../equation.ts";

export const angleOfView = equation({
  id: "angle-of-view",
  title: "correction for the angle of view of a route",
  version: 1,
  tex: String.raw`K_{\theta} = 10 \lg \frac{\theta}{180}`,
  value: { symbol: String.raw`K_{\theta}`, unit: "dB" },
  inputs: { angleDeg: { kind: "one", symbol: String.raw`\theta`, unit: "°", min: 0, aboveMin: true, max: 180 } },
  source: { document: "BS 5228-1", edition: "2009+A1:2014", clause: "Annex F, F.2.5", checked: "memory" },
  work: ({ angleDeg }) => 10 * Math.log10(angleDeg / 180),
});
