import { describe, expect, it } from "vitest";
import { flatLine } from "./flat-line";
import { grossRange } from "./gross-range";
import { spike } from "./spike";
import { steepestChange } from "./steepest-change";

/** Hourly wind, m/s. Expected flags: produced with the open reference implementation of QARTOD (ioos_qc, qartod.py). */
const WIND = [4.0, 5.1, 6.3, 30.0, 7.2, 8.0, 8.0, 8.0, 8.0, 8.0, -1.0, Number.NaN];
const TIME = WIND.map((_, hour) => hour * 3600);

const wide = { failLow: 0, failHigh: 100, suspectLow: 0, suspectHigh: 75 };
const flat = { suspectCount: 3, failCount: 5, tolerance: 0.5, leastHours: 0 };

describe("the flags of an hourly wind", () => {
  it.each([
    ["gross range 0–100, 0–75", grossRange(WIND, wide), "1 1 1 1 1 1 1 1 1 1 4 9"],
    ["spike 20/40, average", spike(WIND, { low: 20, high: 40, method: "average" }), "2 1 1 3 1 1 1 1 1 1 2 9"],
    [
      "spike 10/20, average, which flags both neighbours",
      spike(WIND, { low: 10, high: 20, method: "average" }),
      "2 1 3 4 3 1 1 1 1 1 2 9",
    ],
    [
      "spike 10/20, differential",
      spike(WIND, { low: 10, high: 20, method: "differential" }),
      "2 1 1 4 1 1 1 1 1 1 2 9",
    ],
    ["fixed rate, 10 m/s per hour", steepestChange(TIME, WIND, 10), "1 1 1 3 3 1 1 1 1 1 1 9"],
    ["flat line, 3 or 5 within 0.5 m/s", flatLine(TIME, WIND, flat), "1 1 1 1 1 1 1 3 3 4 1 9"],
  ])("%s", (_, flags, expected) => {
    expect([...flags].join(" ")).toBe(expected);
  });
});
