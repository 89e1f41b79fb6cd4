import { z } from "zod";
import { formatNumber, fromDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import { freezingPoint, layerDensities, type SalinityScale } from "./water-density";

/** What a form may hold: beyond is a slip of the hand, not seawater. Common practice, no source. */
const TEMPERATURE = { min: -2.5, max: 40 };
const SALINITY = { min: 0, max: 42 };
/** m */
export const LAYER_DEPTH = { min: 0.1, max: 1000 };
/** Colder than the freezing point by more than this is refused: readings and rounding, °C. */
const FREEZING_ALLOWANCE = 0.1;

export const SALINITY_SCALES: readonly { value: SalinityScale; unit: string; label: string }[] = [
  { value: "absolute", unit: "g/kg", label: "Absolute Salinity, g/kg" },
  { value: "practical", unit: "PSS-78", label: "Practical Salinity, PSS-78" },
];

export function scaleUnit(scale: SalinityScale): string {
  return scale === "absolute" ? "g/kg" : "PSS-78";
}

// Checks stop at the first that fails: what is no seawater has no density to be compared by.
const temperature = z
  .number({ error: "Write the temperature in °C." })
  .min(TEMPERATURE.min, { error: `Seawater is not colder than ${TEMPERATURE.min} °C.`, abort: true })
  .max(TEMPERATURE.max, { error: `This must be at most ${TEMPERATURE.max} °C: is it in °F?`, abort: true });

const salinity = z
  .number({ error: "Write the salinity." })
  .min(SALINITY.min, { error: "Salinity cannot be negative.", abort: true })
  .max(SALINITY.max, {
    error: `This must be at most ${SALINITY.max}: saltier water is beyond the equation of state.`,
    abort: true,
  });

/** Digits that survive a conversion there and back. */
const SURE_DIGITS = 10;

export function layerDepth(units: UnitChoices) {
  const { unit } = displayUnit("layerDepth", units);
  const shown = (metres: number) => `${Number((metres / fromDisplay(1, "layerDepth", units)).toPrecision(3))} ${unit}`;
  return z
    .number({ error: `Write the depth of the layer in ${unit}.` })
    .transform((value) => Number(fromDisplay(value, "layerDepth", units).toPrecision(SURE_DIGITS)))
    .refine((metres) => metres >= LAYER_DEPTH.min && metres <= LAYER_DEPTH.max, {
      error: `This must lie between ${shown(LAYER_DEPTH.min)} and ${shown(LAYER_DEPTH.max)}.`,
      abort: true,
    });
}

export const columnName = z
  .string("Write the name of the column.")
  .trim()
  .min(1, "Write the name of the column.")
  .max(120, "Use at most 120 characters.");

export const columnSource = z
  .string("Say where the numbers come from.")
  .trim()
  .min(1, "Say where the numbers come from.")
  .max(500, "Use at most 500 characters.");

/** The form of a water column, read in the organisation's unit of length and turned to SI. */
export function waterSchema(units: UnitChoices) {
  return z
    .object({
      name: columnName,
      source: columnSource,
      salinityScale: z.enum(["absolute", "practical"], "Choose the scale of the salinities."),
      temperature,
      salinity,
      layerDepth: layerDepth(units),
      belowTemperature: temperature.optional(),
      belowSalinity: salinity.optional(),
    })
    .superRefine((column, context) => {
      const { belowTemperature, belowSalinity, salinityScale } = column;
      const say = (path: keyof typeof column, message: string) =>
        context.addIssue({ code: "custom", path: [path], message });
      const liquid = (path: "temperature" | "belowTemperature", t: number, S: number) => {
        const freezing = freezingPoint(S, salinityScale);
        if (t < freezing - FREEZING_ALLOWANCE) {
          say(path, `At this salinity seawater freezes at ${formatNumber(freezing, 1)} °C: one of the two is wrong.`);
        }
      };
      liquid("temperature", column.temperature, column.salinity);
      if (belowTemperature === undefined && belowSalinity === undefined) return;
      if (belowTemperature === undefined)
        return say("belowTemperature", "Give the temperature of the water below too, or leave both empty.");
      if (belowSalinity === undefined)
        return say("belowSalinity", "Give the salinity of the water below too, or leave both empty.");
      liquid("belowTemperature", belowTemperature, belowSalinity);
      const below = { temperature: belowTemperature, salinity: belowSalinity };
      const densities = layerDensities({ ...column, below });
      if (densities.stable) return;
      say(
        "belowTemperature",
        `The water below (${densityText(densities.below)}) is lighter than the layer above it (${densityText(densities.layer)}), so the column would turn over. Check temperatures and salinities.`,
      );
    });
}

export type WaterValues = z.output<ReturnType<typeof waterSchema>>;

/** `σ0 24.13 kg/m³` */
export function densityText(sigma0: number | null): string {
  return sigma0 === null ? "density not known" : `σ0 ${formatNumber(sigma0, 2)} kg/m³`;
}
