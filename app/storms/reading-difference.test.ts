import { describe, expect, it } from "vitest";
import { readSeries } from "~/readers/read-series";
import { readingDifference } from "./reading-difference";

const bytes = new TextEncoder().encode(
  "time,wind (kn),dir,rain (mm)\n2026-11-04 00:00,10,200,1\n2026-11-04 01:00,20,210,2\n",
);
const reading = (answers: Parameters<typeof readSeries>[0]["answers"]) =>
  readSeries({ bytes, fileName: "a.csv", answers });

describe("what an answer changed", () => {
  it("is nothing where the reading is the same", () => {
    expect(readingDifference(reading({ zone: "UTC" }), reading({ zone: "UTC" }))).toEqual([]);
  });

  it("shows the zone and both stamps", () => {
    const lines = readingDifference(reading({ zone: "UTC" }), reading({ zone: "+05:30" }));
    const stamps = lines.find(({ what }) => what === "first stamp (UTC)");
    expect(lines.map(({ what }) => what)).toContain("time zone");
    expect(stamps).toEqual({
      what: "first stamp (UTC)",
      before: "2026-11-04T00:00:00Z",
      after: "2026-11-03T18:30:00Z",
    });
  });

  it("shows that a channel has gone", () => {
    const lines = readingDifference(reading({}), reading({ columns: { 3: { role: "leftOut" } } }));
    expect(lines).toContainEqual({ what: "rain rate: total", before: "3 mm", after: "none" });
  });
});
