import { describe, expect, it } from "vitest";
import { readSeries } from "~/readers/read-series";
import { freeName, postedName, proposeStormName } from "./storm-name";

const read = (text: string, fileName: string) => readSeries({ bytes: new TextEncoder().encode(text), fileName });

describe("a storm without a name", () => {
  it("is named after the day of its strongest wind, in the project's zone", () => {
    const reading = read(
      "time (UTC),wind speed (m/s)\n2026-11-04T22:00Z,5\n2026-11-04T23:30Z,25\n2026-11-05T01:00Z,9\n",
      "a.csv",
    );
    expect(proposeStormName(reading, "UTC")).toBe("Storm of 2026-11-04");
    expect(proposeStormName(reading, "Asia/Kolkata")).toBe("Storm of 2026-11-05");
  });

  it("is named after its file where there is no wind", () => {
    const reading = read("time (UTC),rain (mm/h)\n2026-11-04T22:00Z,5\n2026-11-04T23:00Z,1\n", "gauge 7.csv");
    expect(proposeStormName(reading, "UTC")).toBe("gauge 7");
  });

  it("takes the first number that is free", () => {
    expect(freeName("Gale", new Set())).toBe("Gale");
    expect(freeName("Gale", new Set(["Gale", "Gale (2)"]))).toBe("Gale (3)");
    expect(freeName("x".repeat(120), new Set(["x".repeat(120)]))).toHaveLength(117);
  });

  it("is refused a name that is too long", () => {
    const form = new FormData();
    form.set("name", "x".repeat(121));
    expect(() => postedName(form)).toThrow("120 characters");
  });
});
