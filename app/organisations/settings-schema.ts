import { z } from "zod";
import { UNIT_OPTIONS, type UnitChoices } from "~/units/unit-choices";

const CHOOSE = "Choose one of the list.";

function unit<Key extends keyof UnitChoices>(key: Key) {
  return z.enum(UNIT_OPTIONS[key] as readonly [UnitChoices[Key], ...UnitChoices[Key][]], CHOOSE);
}

export const PAPER_SIZES = ["A4", "Letter"] as const;

export const organisationSettingsSchema = z.object({
  name: z
    .string("Write the organisation's name.")
    .trim()
    .min(2, "Write at least two characters.")
    .max(120, "Use at most 120 characters."),
  paperSize: z.enum(PAPER_SIZES, CHOOSE),
  speed: unit("speed"),
  rain: unit("rain"),
  length: unit("length"),
  distance: unit("distance"),
  salinity: unit("salinity"),
});

export type OrganisationSettings = z.output<typeof organisationSettingsSchema>;
