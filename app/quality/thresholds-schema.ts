/** Thresholds as they are stored, checked on their way in and out. */
import { z } from "zod";
import { CHANNEL_NAMES } from "~/readers/reading";
import {
  CHANNEL_FIELDS,
  RELATION_FIELDS,
  type ChannelField,
  type ChannelThresholds,
  type RelationField,
  type RelationThresholds,
  type ThresholdField,
} from "./thresholds";

const FARTHEST = 1e6;

function numberOf({ min = -FARTHEST, max = FARTHEST, whole }: ThresholdField) {
  const number = z
    .number({ error: "Write a number, or leave it open." })
    .min(min, `Write ${min} or more.`)
    .max(max, `Write ${max} or less.`);
  return (whole ? number.int("Write a whole number.") : number).nullable();
}

function fieldsOf<Key extends string>(fields: Record<Key, ThresholdField>) {
  const entries = Object.entries<ThresholdField>(fields).map(([key, field]) => [key, numberOf(field)]);
  return Object.fromEntries(entries) as Record<Key, ReturnType<typeof numberOf>>;
}

const month = z.number().int().min(1, "Months are numbered from 1.").max(12, "Months are numbered up to 12.");
const season = z
  .object({ fromMonth: month, toMonth: month, low: z.number(), high: z.number() })
  .refine(({ low, high }) => low < high, "The lowest is below the highest.");

/** Two limits of which the first may not lie beyond the second, and where to say so. */
const ORDERED: [lower: ChannelField, higher: ChannelField, message: string][] = [
  ["failLow", "failHigh", "The upper limit lies above the lower one."],
  ["suspectLow", "suspectHigh", "The upper limit lies above the lower one."],
  ["failLow", "suspectLow", "What is suspect begins inside of what is bad."],
  ["suspectHigh", "failHigh", "What is bad begins beyond what is suspect."],
  ["spikeLow", "spikeHigh", "What is bad begins beyond what is suspect."],
  ["flatSuspectCount", "flatFailCount", "What is bad begins beyond what is suspect."],
  ["attenuatedFail", "attenuatedSuspect", "What is suspect begins above what is bad."],
];

/** Fields that say nothing without each other. */
const TOGETHER: [given: ChannelField, needed: ChannelField, message: string][] = [
  ["rateDeviations", "rateHours", "Write over how many hours."],
  ["flatSuspectCount", "flatTolerance", "Write within what values are alike."],
  ["flatFailCount", "flatTolerance", "Write within what values are alike."],
  ["attenuatedSuspect", "attenuatedHours", "Write over how many hours."],
  ["attenuatedFail", "attenuatedHours", "Write over how many hours."],
];

export const channelThresholdsSchema = z
  .object({
    ...fieldsOf(CHANNEL_FIELDS),
    spikeMethod: z.enum(["differential", "average"], "Choose how a spike is found."),
    seasons: z.array(season).max(12),
  })
  .superRefine((values, context) => {
    for (const [lower, higher, message] of ORDERED) {
      const [low, high] = [values[lower], values[higher]];
      if (low !== null && high !== null && low > high) context.addIssue({ code: "custom", path: [higher], message });
    }
    for (const [given, needed, message] of TOGETHER) {
      if (values[given] !== null && values[needed] === null) {
        context.addIssue({ code: "custom", path: [needed], message });
      }
    }
  }) satisfies z.ZodType<ChannelThresholds>;

export const relationThresholdsSchema = z.object(
  fieldsOf<RelationField>(RELATION_FIELDS),
) satisfies z.ZodType<RelationThresholds>;

export const chosenThresholdsSchema = z.object({
  channels: z.partialRecord(z.enum(CHANNEL_NAMES), channelThresholdsSchema),
  relations: relationThresholdsSchema.optional(),
});
