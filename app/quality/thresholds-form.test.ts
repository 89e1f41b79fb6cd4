import { describe, expect, it } from "vitest";
import { CHANNEL_NAMES } from "~/readers/reading";
import { defaultChannelThresholds, defaultRelations } from "./default-thresholds";
import {
  channelGroups,
  postedChannelThresholds,
  postedRelations,
  relationGroups,
  seasonsText,
  ThresholdsRefused,
  type FormGroup,
} from "./thresholds-form";

function filled(groups: FormGroup[], changes: Record<string, string> = {}): FormData {
  const form = new FormData();
  for (const { name, value } of groups.flatMap(({ fields }) => fields)) form.set(name, value);
  for (const [name, value] of Object.entries({ spikeMethod: "differential", seasons: "", ...changes }))
    form.set(name, value);
  return form;
}

const wind = channelGroups("windSpeed", defaultChannelThresholds("windSpeed"));

function refusedFields(changes: Record<string, string>): Partial<Record<string, string[]>> {
  try {
    postedChannelThresholds(filled(wind, changes));
  } catch (error) {
    if (error instanceof ThresholdsRefused) return error.errors;
    throw error;
  }
  return {};
}

describe("the form of thresholds", () => {
  it.each(CHANNEL_NAMES)("shows and reads the defaults of %s as they are", (channel) => {
    const limits = defaultChannelThresholds(channel);
    expect(postedChannelThresholds(filled(channelGroups(channel, limits)))).toEqual(limits);
  });

  it("does so for the tests between channels", () => {
    expect(postedRelations(filled(relationGroups(defaultRelations())))).toEqual(defaultRelations());
  });

  it("reads a decimal comma, a typographic minus, an open field and seasons", () => {
    const seasons = "6-9: 0 to 45";
    const read = postedChannelThresholds(filled(wind, { failLow: "\u22120,5", suspectHigh: " ", seasons }));
    expect([read.failLow, read.suspectHigh, seasonsText(read)]).toEqual([-0.5, null, seasons]);
  });

  it("names the unit of each field: a direction's spikes are of its components", () => {
    const unitOf = (groups: FormGroup[], name: string) =>
      groups.flatMap(({ fields }) => fields).find((field) => field.name === name)?.unit;
    const from = channelGroups("windFrom", defaultChannelThresholds("windFrom"));
    expect(["failHigh", "spikeLow", "rateSteepest", "flatSuspectCount"].map((name) => unitOf(from, name))).toEqual([
      "°",
      "m/s",
      "m/s per hour",
      "values",
    ]);
  });

  it.each([
    [{ failHigh: "many" }, "failHigh"],
    [{ failLow: "200" }, "failHigh"],
    [{ suspectHigh: "500" }, "failHigh"],
    [{ rateHours: "" }, "rateHours"],
    [{ flatSuspectCount: "2.5" }, "flatSuspectCount"],
    [{ flatFailCount: "1" }, "flatFailCount"],
    [{ spikeLow: "-1" }, "spikeLow"],
    [{ failHigh: "1e300" }, "failHigh"],
    [{ seasons: "summer" }, "seasons"],
    [{ spikeMethod: "magic" }, "spikeMethod"],
  ])("refuses %o beside %s", (changes, field) => {
    const errors = refusedFields(changes);
    expect(Object.keys(errors)).toContain(field);
    expect(errors[field]?.[0]).toMatch(/\.$/);
  });
});
