import { describe, expect, it } from "vitest";
import { readFilter } from "./flag-filter";
import { findSamples, namedSamples, type SamplePlace } from "./find-samples";
import { flagsCsv } from "./flags-csv";
import type { JudgedChannel } from "./judge-storm";

const wind: JudgedChannel = {
  channel: "windSpeed",
  unit: "m/s",
  recordId: "r",
  time: Float64Array.of(0, 3600, 7200, 10_800, 14_400),
  values: Float64Array.of(5, 60, Number.NaN, 6, -7.5),
  gaps: [],
  step: 3600,
  tests: [
    { test: "gross range", flags: Uint8Array.of(1, 1, 9, 1, 4) },
    { test: "spike", flags: Uint8Array.of(2, 4, 9, 3, 2) },
  ],
  flags: Uint8Array.of(1, 4, 9, 3, 4),
  inForce: Uint8Array.of(1, 1, 9, 3, 4),
};
const rain: JudgedChannel = { ...wind, channel: "rain", unit: "mm/h", tests: [] };
const window = { startsAt: 0, endsAt: 14_400 };
const isSet = ({ judged, k }: SamplePlace) => judged.inForce[k] !== judged.flags[k];
const found = (query: string, judged = [wind]) =>
  findSamples(judged, readFilter(new URLSearchParams(query), "UTC").filter, window, isSet).map(({ k }) => k);

describe("the filter of the flags table", () => {
  it.each([
    ["", [1, 3, 4]],
    ["flag=all", [0, 1, 2, 3, 4]],
    ["flag=3", [3]],
    ["flag=9", [2]],
    ["flag=set", [1]],
    ["test=spike", [1, 3]],
    ["test=spike&flag=4", [1]],
    ["test=light at night", []],
    ["channel=rain", []],
    ["flag=all&from=1970-01-01 02:00", [2, 3, 4]],
    ["flag=all&from=1970-01-01 01:00&to=1970-01-01 02:00", [1, 2]],
    ["flag=nonsense&test=nonsense&page=-3", [1, 3, 4]],
  ])("%s", (query, expected) => {
    expect(found(query)).toEqual(expected);
  });

  it("tells what is no time, and an end before its start, and leaves a wild page number at the first", () => {
    const { problems, filter, page } = readFilter(new URLSearchParams("from=yesterday&page=x"), "UTC");
    expect([problems.from, filter.from, page]).toEqual([
      ["Write a date and a time, such as 2026-11-04 20:00."],
      null,
      1,
    ]);
    expect(readFilter(new URLSearchParams("from=2026-01-02 00:00&to=2026-01-01 00:00"), "UTC").problems.to).toEqual([
      "The end must come after the start.",
    ]);
  });

  it("finds ticked samples by name and passes over names of none", () => {
    expect(
      namedSamples([wind, rain], ["windSpeed@3600", "rain@0", "rain@1", "x"]).map(({ judged, k }) => [
        judged.channel,
        k,
      ]),
    ).toEqual([
      ["windSpeed", 1],
      ["rain", 0],
    ]);
  });
});

describe("values with their flags as CSV", () => {
  it("has a line each, numbers that stay numbers, and a reason that runs nowhere as a formula", () => {
    const places = [1, 2, 4].map((k) => ({ judged: wind, k }));
    const [header, ...lines] = flagsCsv(places, ({ k }) => (k === 1 ? { reason: '=1+1, "checked"' } : null)).split(
      "\r\n",
    );
    expect(header).toMatch(/^time \(UTC\),channel,value,unit,flag in force,flag of the tests,flag of gross range,/);
    expect(lines).toEqual([
      `1970-01-01T01:00:00.000Z,wind speed,60,m/s,1,4,1,,4,,,,,,,,"'=1+1, ""checked"""`,
      "1970-01-01T02:00:00.000Z,wind speed,,m/s,9,9,9,,9,,,,,,,,",
      "1970-01-01T04:00:00.000Z,wind speed,-7.5,m/s,4,4,4,,2,,,,,,,,",
      "",
    ]);
  });
});
