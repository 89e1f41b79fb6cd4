/** An invented storm over an invented layer, smooth and deterministic: something to draw, not something to believe. */
import { DEFAULT_UNITS } from "~/units/unit-choices";
import { epochSeconds } from "~/units/format-time";
import type { FigureContext } from "~/figures/figure-context";
import { serverPlotDocument } from "~/figures/plot-document.server";

export const HOURS = 121;
const start = epochSeconds("2026-11-03T00:00:00Z");
const hours = Array.from({ length: HOURS }, (_, hour) => hour);
const bump = (hour: number, middle: number, width: number) => Math.exp(-(((hour - middle) / width) ** 2));

export const time = hours.map((hour) => start + hour * 3600);
export const windSpeed10 = hours.map((h) => 4 + 21 * bump(h, 44, 18) + 0.6 * Math.sin(h));
export const windFrom = hours.map((h) => (150 + 110 / (1 + Math.exp(-(h - 44) / 6)) + 360) % 360);
export const windGust = windSpeed10.map((speed, h) => speed * (1.25 + 0.05 * Math.sin(h * 2)));
export const rainRate = hours.map((h) => Math.round(95 * bump(h, 38, 11)) / 10);
export const netHeat = hours.map(
  (h) => -120 - 240 * bump(h, 44, 16) + 160 * Math.max(0, Math.sin(((h - 6) / 12) * Math.PI)),
);

/** Swept by the wind, then inertial circles that die away; period 14.7 h, clockwise. */
export const driftEast = hours.map((h) => 0.9 * bump(h, 46, 14) + inertial(h) * Math.cos((h * 2 * Math.PI) / 14.7));
export const driftNorth = hours.map((h) => -0.5 * bump(h, 48, 14) - inertial(h) * Math.sin((h * 2 * Math.PI) / 14.7));
function inertial(hour: number): number {
  return (0.55 / (1 + Math.exp(-(hour - 44) / 5))) * Math.exp(-Math.max(0, hour - 44) / 120);
}
const running = (values: number[]) =>
  values.map((_, i) => values.slice(1, i + 1).reduce((sum, v) => sum + v * 3600, 0));
export const displacementEast = running(driftEast);
export const displacementNorth = running(driftNorth);

export const stressX = hours.map((h) => 1.3 * bump(h, 46, 14));
export const stressY = hours.map((h) => 1.0 * bump(h, 42, 14));
export const salinity = hours.map(
  (h) => 33.6 - 1.7 / (1 + Math.exp(-(h - 38) / 5)) + 0.8 / (1 + Math.exp(-(h - 85) / 14)),
);
export const temperature = hours.map((h) => 12.4 - 0.9 / (1 + Math.exp(-(h - 50) / 9)));
export const density = salinity.map((s, i) => 1000 + 0.77 * s - 0.17 * (temperature[i] ?? 0));
export const layerDepth = hours.map((h) => 14 + 12 / (1 + Math.exp(-(h - 50) / 10)));

export const triggerLevels = [
  { quantity: "salinity", side: "below", value: 32.5, hours: 6 },
  { quantity: "temperature", side: "below", value: 4, hours: 6 },
] as const;

export function context(changes: Partial<FigureContext> = {}): FigureContext {
  return { document: serverPlotDocument(), zone: "UTC", units: DEFAULT_UNITS, estimateCode: "2617-07", ...changes };
}

/** A box and a piece of coast around it, in metres east and north of its middle. */
export const boxOutline: [number, number][] = [
  [-2000, -1600],
  [2000, -1600],
  [2000, 1600],
  [-2000, 1600],
];
export const coast: [number, number][][] = [
  [
    [-60_000, -90_000],
    [-6000, -90_000],
    [-9000, -50_000],
    [-4000, -20_000],
    [-7000, 10_000],
    [-14_000, 30_000],
    [-60_000, 60_000],
  ],
];
