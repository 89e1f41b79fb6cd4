/** The thresholds of one part of the tests as a form shows and sends them: texts, an open field for no test. */
import type { z } from "zod";
import { CHANNEL_NAMES, CHANNEL_UNITS, type ChannelName } from "~/readers/reading";
import { StormRefusal, WHOLE_FORM, type FormErrorsByField } from "~/storms/refusal";
import { defaultChannelThresholds, defaultRelations, defaultSources, RELATION_SOURCES } from "./default-thresholds";
import { formatSeasons, readSeasons } from "./season-text";
import {
  CHANNEL_FIELDS,
  RELATION_FIELDS,
  type ChannelField,
  type ChannelThresholds,
  type RelationField,
  type RelationThresholds,
  type TestName,
  type ThresholdField,
} from "./thresholds";
import { channelThresholdsSchema, relationThresholdsSchema } from "./thresholds-schema";

/** A channel, or the tests that set channels against each other. */
export type ThresholdPart = ChannelName | "relations";
export const THRESHOLD_PARTS: readonly ThresholdPart[] = [...CHANNEL_NAMES, "relations"];

/** What a form sends is wrong in these fields. */
export class ThresholdsRefused extends StormRefusal {
  constructor(readonly errors: FormErrorsByField) {
    super(Object.values(errors).flatMap((messages) => messages ?? []));
  }
}

export interface FormField {
  name: string;
  label: string;
  unit: string;
  value: string;
  /** As text; `none` where the test is left open by default. */
  byDefault: string;
}

export interface FormGroup {
  test: TestName;
  /** Where the defaults come from. */
  source: string;
  fields: FormField[];
}

/** Components of the wind are what these look at, where the channel is its direction. */
const ON_COMPONENTS: readonly string[] = ["spikeLow", "spikeHigh", "rateLeast", "rateSteepest"];

function unitOf(part: ThresholdPart, key: string, { unit }: ThresholdField): string {
  if (part === "relations" || (unit !== "value" && unit !== "perHour")) return unit;
  const own = part === "windFrom" && ON_COMPONENTS.includes(key) ? "m/s" : CHANNEL_UNITS[part].replace("deg", "°");
  return unit === "value" ? own : `${own} per hour`;
}

const asText = (value: number | null) => (value === null ? "" : String(value));

function groupsOf<Key extends string>(
  part: ThresholdPart,
  fields: Record<Key, ThresholdField>,
  values: Record<Key, number | null>,
  defaults: Record<Key, number | null>,
  sources: Partial<Record<TestName, string>>,
): FormGroup[] {
  const keys = Object.keys(fields) as Key[];
  const tests = [...new Set(keys.map((key) => fields[key].test))];
  return tests.map((test) => ({
    test,
    source: sources[test] ?? "",
    fields: keys
      .filter((key) => fields[key].test === test)
      .map((key) => ({
        name: key,
        label: fields[key].label,
        unit: unitOf(part, key, fields[key]),
        value: asText(values[key]),
        byDefault: asText(defaults[key]) || "none",
      })),
  }));
}

export function channelGroups(channel: ChannelName, limits: ChannelThresholds): FormGroup[] {
  return groupsOf<ChannelField>(
    channel,
    CHANNEL_FIELDS,
    limits,
    defaultChannelThresholds(channel),
    defaultSources(channel),
  );
}

export function relationGroups(limits: RelationThresholds): FormGroup[] {
  return groupsOf<RelationField>("relations", RELATION_FIELDS, limits, defaultRelations(), RELATION_SOURCES);
}

export function seasonsText(limits: ChannelThresholds): string {
  return formatSeasons(limits.seasons);
}

function textOf(form: FormData, name: string): string {
  const written = form.get(name);
  return typeof written === "string" ? written.trim() : "";
}

/** NaN for what is no number, which the schema refuses. */
function numbersOf<Key extends string>(form: FormData, fields: Record<Key, ThresholdField>) {
  return Object.fromEntries(
    Object.keys(fields).map((key) => {
      const text = textOf(form, key).replace(",", ".").replace("\u2212", "-");
      return [key, text === "" ? null : Number(text)];
    }),
  ) as Record<Key, number | null>;
}

function parsed<Output>(schema: z.ZodType<Output>, values: unknown): Output {
  const result = schema.safeParse(values);
  if (result.success) return result.data;
  const errors: Record<string, string[]> = {};
  for (const { path, message } of result.error.issues) {
    (errors[String(path[0] ?? WHOLE_FORM)] ??= []).push(message);
  }
  throw new ThresholdsRefused(errors);
}

/** @throws ThresholdsRefused beside the fields */
export function postedChannelThresholds(form: FormData): ChannelThresholds {
  const seasons = readSeasons(textOf(form, "seasons"));
  if ("problem" in seasons) throw new ThresholdsRefused({ seasons: [seasons.problem] });
  return parsed(channelThresholdsSchema, {
    ...numbersOf<ChannelField>(form, CHANNEL_FIELDS),
    spikeMethod: textOf(form, "spikeMethod"),
    seasons,
  });
}

/** @throws ThresholdsRefused beside the fields */
export function postedRelations(form: FormData): RelationThresholds {
  return parsed(relationThresholdsSchema, numbersOf<RelationField>(form, RELATION_FIELDS));
}
