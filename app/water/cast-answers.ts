import { z } from "zod";
import type { CastAnswers } from "~/readers/casts/cast-reading";

/** Only what a person filled in is an answer: an empty field stands for "as read". */
const answersSchema = z.object({
  half: z.enum(["down", "up"], "Choose the way down or the way up.").optional(),
  latitude: z
    .string()
    .transform((text) => Number(text.replace(",", ".")))
    .pipe(
      z
        .number("Write a latitude in degrees, south negative.")
        .min(-90, "A latitude lies between −90° and 90°.")
        .max(90, "A latitude lies between −90° and 90°."),
    )
    .optional(),
  salinityScale: z.enum(["practical", "absolute"], "Choose the kind of salinity.").optional(),
  temperatureScale: z.enum(["ITS-90", "IPTS-68"], "Choose the scale of temperature.").optional(),
}) satisfies z.ZodType<CastAnswers>;

/** The answers of a cast's sheet as posted; `errors` by field name where one cannot be taken. */
export function readCastAnswers(form: FormData): { answers: CastAnswers } | { errors: Record<string, string[]> } {
  const filled = [...form].filter(([, value]) => typeof value === "string" && value.trim() !== "");
  const read = answersSchema.safeParse(Object.fromEntries(filled));
  if (read.success) return { answers: read.data };
  const errors: Record<string, string[]> = {};
  for (const { path, message } of read.error.issues) (errors[String(path[0])] ??= []).push(message);
  return { errors };
}
