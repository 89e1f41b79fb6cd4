import { z } from "zod";
import {
  CAST_CHANNEL_NAMES,
  type CastAnswers,
  type CastChannel,
  type CastQuestion,
} from "~/readers/casts/cast-reading";

const latitude = z
  .string()
  .transform((text) => Number(text.replace(",", ".")))
  .pipe(
    z
      .number("Write a latitude in degrees, south negative.")
      .min(-90, "A latitude lies between −90° and 90°.")
      .max(90, "A latitude lies between −90° and 90°."),
  );

/** Only what a person filled in is an answer: an empty field stands for "as read". */
const answersSchema = z.object({
  cast: z.string().optional(),
  half: z.enum(["down", "up"], "Choose the way down or the way up.").optional(),
  latitude: latitude.optional(),
  salinityScale: z.enum(["practical", "absolute"], "Choose the kind of salinity.").optional(),
  temperatureScale: z.enum(["ITS-90", "IPTS-68"], "Choose the scale of temperature.").optional(),
}) satisfies z.ZodType<CastAnswers>;

/** A choice among options that the sheet showed. */
const OF_CHANNEL = /^(column|unit)-(.+)$/;

/**
 * The answers of a cast's sheet as posted, read against the questions that it showed.
 * @returns `errors` by field name where one cannot be taken
 */
export function readCastAnswers(
  form: FormData,
  questions: readonly CastQuestion[],
): { answers: CastAnswers } | { errors: Record<string, string[]> } {
  const filled = new Map<string, string>();
  for (const [name, value] of form)
    if (typeof value === "string" && value.trim() !== "") filled.set(name, value.trim());
  const errors: Record<string, string[]> = {};
  for (const { key, options } of questions) {
    const value = filled.get(key);
    if (value === undefined || !options || options.some((option) => option.value === value)) continue;
    errors[key] = ["Choose one of the list."];
  }
  const read = answersSchema.safeParse(Object.fromEntries(filled));
  for (const { path, message } of read.error?.issues ?? []) errors[String(path[0])] = [message];
  if (!read.success || Object.keys(errors).length > 0) return { errors };
  const columns: NonNullable<CastAnswers["columns"]> = {};
  const units: NonNullable<CastAnswers["units"]> = {};
  for (const { key } of questions) {
    const [, kind, name] = OF_CHANNEL.exec(key) ?? [];
    const channel = channelOf(name);
    const value = filled.get(key);
    if (channel === undefined || value === undefined) continue;
    if (kind === "column") columns[channel] = Number(value);
    else units[channel] = value;
  }
  return {
    answers: {
      ...read.data,
      ...(Object.keys(columns).length > 0 && { columns }),
      ...(Object.keys(units).length > 0 && { units }),
    },
  };
}

function channelOf(name: string | undefined): CastChannel | undefined {
  return CAST_CHANNEL_NAMES.find((channel) => channel === name);
}
