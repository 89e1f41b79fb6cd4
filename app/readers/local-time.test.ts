import { describe, expect, it } from "vitest";
import { zoneByName } from "./local-time";

const clock = (iso: string): number => Date.parse(`${iso}Z`) / 1000;
const iso = (seconds: number): string => new Date(seconds * 1000).toISOString().slice(0, 19);

describe("zoneByName", () => {
  it("gives both times of 2024-11-03 01:30 in New York", () => {
    const time = zoneByName("America/New_York")?.toUtc(clock("2024-11-03T01:30:00"));
    expect(time?.kind === "twice" && [iso(time.utc), iso(time.later)]).toEqual([
      "2024-11-03T05:30:00",
      "2024-11-03T06:30:00",
    ]);
  });

  it("knows the hour that never was", () => {
    expect(zoneByName("America/New_York")?.toUtc(clock("2024-03-10T02:30:00"))).toEqual({ kind: "never" });
  });

  it("agrees with itself on the days around a change, where the day's offset is not steady", () => {
    const zone = zoneByName("Europe/Lisbon");
    const winter = zone?.toUtc(clock("2024-03-31T00:30:00"));
    const summer = zone?.toUtc(clock("2024-03-31T02:30:00"));
    expect(winter?.kind === "one" && iso(winter.utc)).toBe("2024-03-31T00:30:00");
    expect(summer?.kind === "one" && iso(summer.utc)).toBe("2024-03-31T01:30:00");
  });

  it.each(["", "Nowhere/Land", "+25:00", "12", "UTC+2x", "../etc"])("does not know “%s”", (name) => {
    expect(zoneByName(name)).toBeNull();
  });
});
