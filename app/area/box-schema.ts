import { z } from "zod";
import { TRIGGER_QUANTITIES, type Position, type TriggerQuantity } from "~/ocean/scenario";
import { formatQuantity, fromDisplay } from "~/units/format-quantity";
import { displayUnit, type QuantityId } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";

/** How each quantity of a trigger level is shown and limited. */
export const TRIGGER_QUANTITY_IDS: Record<TriggerQuantity, QuantityId> = {
  salinity: "salinity",
  temperature: "temperature",
  driftSpeed: "driftSpeed",
  stress: "stress",
  layerDepth: "layerDepth",
  density: "density",
};

export const MOST_TRIGGER_LEVELS = 6;

const position = z.tuple([z.number(), z.number()]);

/** The map and the coordinate field both write this. Whether it is a sound box is said by `checkBox`. */
const polygon = z.string("Draw the box on the map, or type its corners.").transform((text, context): Position[] => {
  try {
    return z.array(position).parse(JSON.parse(text)) as Position[];
  } catch {
    context.addIssue({ code: "custom", message: "Draw the box on the map, or type its corners." });
    return z.NEVER;
  }
});

/** A number as typed in the organisation's unit, turned to SI and held to limits that are told in that unit. */
function measured(id: QuantityId, units: UnitChoices, limits: { min: number; max: number }) {
  const shown = (value: number) => formatQuantity(value, id, units).text;
  return z
    .number({ error: `Write a number, in ${displayUnit(id, units).unit}.` })
    .transform((value) => fromDisplay(value, id, units))
    .refine((value) => value >= limits.min && value <= limits.max, {
      error: `This must lie between ${shown(limits.min)} and ${shown(limits.max)}.`,
    });
}

function triggerLevel(units: UnitChoices) {
  return z
    .object({
      quantity: z.enum(TRIGGER_QUANTITIES, "Choose what is limited."),
      side: z.enum(["below", "above"], "Choose a side."),
      value: z.number({ error: "Write the value of the limit." }),
      hours: z
        .number({ error: "Write after how many hours it counts." })
        .min(0, "Hours cannot be negative.")
        .max(8760, "A year has 8760 hours."),
    })
    .transform((level) => ({
      ...level,
      value: fromDisplay(level.value, TRIGGER_QUANTITY_IDS[level.quantity], units),
    }));
}

/** The form of a study box, read in the organisation's units and turned to SI. */
export function boxSchema(units: UnitChoices) {
  return z.object({
    name: z.string("Name the box.").trim().min(1, "Name the box.").max(120, "Use at most 120 characters."),
    polygon,
    waterDepth: measured("depth", units, { min: 0.5, max: 11_000 }).optional(),
    shoreNormal: z
      .number({ error: "Write a bearing in degrees true." })
      .min(0, "A bearing lies between 0 and 360 degrees.")
      .max(360, "A bearing lies between 0 and 360 degrees.")
      .optional(),
    distanceToShore: measured("distance", units, { min: 0, max: 20_000_000 }).optional(),
    triggerLevels: z.array(triggerLevel(units)).max(MOST_TRIGGER_LEVELS).default([]),
  });
}

export type BoxValues = z.output<ReturnType<typeof boxSchema>>;
