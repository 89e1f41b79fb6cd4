import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type CoordinateStyle, EXACT_DECIMALS, formatCorners, formatPosition } from "./format-coordinates";
import { parseCoordinates } from "./parse-coordinates";
import type { Position } from "~/ocean/scenario";

const WANTED: Position = [-8.231, 54.412];

describe("parseCoordinates", () => {
  it.each([
    "54.412 -8.231",
    "54.412, -8.231",
    "54.412,-8.231",
    "54.412; -8.231",
    "54.412\t-8.231",
    "54,412; -8,231",
    "54,412 -8,231",
    "54,412,-8,231",
    "54,412, -8,231",
    "54.412° N 8.231° W",
    "54.412N, 8.231W",
    "N54.412 W8.231",
    "N 54.412°, W 8.231°",
    "8.231 W 54.412 N",
    "W8.231 N54.412",
    "54.412 n 8.231 w",
    "lat: 54.412 lon: -8.231",
    "Latitude 54.412, Longitude -8.231",
    "\u00a054.412° \u22128.231°",
    "54° 24.72' N 8° 13.86' W",
    "54°24.72′N 8°13.86′W",
    "54 24.72 N 8 13.86 W",
    "N 54 24.72, W 8 13.86",
    "54 24,72 N; 8 13,86 W",
    "54 24.72 -8 13.86",
    "54° 24′ 43.2″ N 8° 13′ 51.6″ W",
    "54°24'43.2\"N 8°13'51.6\"W",
    "54°24'43.2''N, 8°13'51.6''W",
    "54 24 43.2 N 8 13 51.6 W",
    "54:24:43.2 N 8:13:51.6 W",
    "54 24 43.2, -8 13 51.6",
  ])("reads %s", (line) => {
    const { corners, problems } = parseCoordinates(line);
    expect(problems).toEqual([]);
    expect(corners).toHaveLength(1);
    expect(corners[0][0]).toBeCloseTo(WANTED[0], 9);
    expect(corners[0][1]).toBeCloseTo(WANTED[1], 9);
  });

  it("trap 42: lets one letter decide for both", () => {
    expect(parseCoordinates("8.231 W, 54.412").corners).toEqual([WANTED]);
  });

  it("trap 42: reads south with its seconds", () => {
    expect(parseCoordinates("16° 54′ 36″ S 179° 48′ 0″ E").corners[0]).toEqual([179.8, -(16 + 54 / 60 + 36 / 3600)]);
    expect(parseCoordinates("16°54'36S 179°48'E").corners[0][1]).toBeCloseTo(-16.91, 9);
  });

  it("reads whole degrees", () => {
    expect(parseCoordinates("54,8\n54 8\n-54 -8\n0 0").corners).toEqual([
      [8, 54],
      [8, 54],
      [-8, -54],
      [0, 0],
    ]);
  });

  it("passes over blank lines and counts them", () => {
    const { corners, problems } = parseCoordinates("54 8\r\n\r\n  \r\nnonsense\r\n55 9");
    expect(corners).toEqual([
      [8, 54],
      [9, 55],
    ]);
    expect(problems).toMatchObject([{ line: 4, code: "unreadable" }]);
    expect(problems[0].message).toMatch(/^Line 4: /);
  });

  it.each<[string, string]>([
    ["54.412", "unreadable"],
    ["54.412 -8.231 12", "unreadable"],
    ["54,412,8,231", "unreadable"],
    ["54.4.1 8.2", "unreadable"],
    ["somewhere off Sligo", "unreadable"],
    ["54 N 8 N", "hemisphere"],
    ["-54 N 8 W", "hemisphere"],
    ["N 54 N 8 W", "hemisphere"],
    ["54 60.5 N 8 10 W", "minutes"],
    ["54 10 75 N 8 10 10 W", "minutes"],
    ["54.5 30 N 8.2 10 W", "minutes"],
    ["95 N 8 W", "range"],
    ["54 N 400 W", "range"],
    ["108.2 12.5", "swapped"],
    ["-179.8 -16.9", "swapped"],
    ["[8.231, 54.412]", "geojson"],
  ])("refuses %s as %s", (line, code) => {
    const { corners, problems } = parseCoordinates(line);
    expect(corners).toEqual([]);
    expect(problems.map((problem) => problem.code)).toEqual([code]);
  });

  it("never throws and never gives a place off the globe", () => {
    const pieces = fc.array(fc.constantFrom(..."0123456789.,;:°'\"NSEWnsew-+ \t[]dms′″"), { maxLength: 30 });
    fc.assert(
      fc.property(pieces, (characters) => {
        for (const [x, y] of parseCoordinates(characters.join("")).corners) {
          expect(Math.abs(x)).toBeLessThanOrEqual(360);
          expect(Math.abs(y)).toBeLessThanOrEqual(90);
        }
      }),
      { numRuns: 2000 },
    );
  });

  it("reads back what was written, in every style, to half of the last decimal", () => {
    const units: Record<CoordinateStyle, number> = { decimal: 1, minutes: 60, seconds: 3600 };
    const corners = fc.array(
      fc.tuple(fc.double({ min: -180, max: 180, noNaN: true }), fc.double({ min: -90, max: 90, noNaN: true })),
      { minLength: 1, maxLength: 5 },
    );
    fc.assert(
      fc.property(corners, fc.constantFrom<CoordinateStyle>("decimal", "minutes", "seconds"), (ring, style) => {
        const half = 0.5000001 / (units[style] * 10 ** EXACT_DECIMALS[style]);
        const { corners: read, problems } = parseCoordinates(formatCorners(ring, style));
        expect(problems).toEqual([]);
        expect(read).toHaveLength(ring.length);
        read.forEach(([x, y], i) => {
          expect(Math.abs(x - ring[i][0])).toBeLessThanOrEqual(half);
          expect(Math.abs(y - ring[i][1])).toBeLessThanOrEqual(half);
        });
      }),
      { numRuns: 500 },
    );
  });
});

describe("formatCorners", () => {
  it("writes as many decimals as the most exact corner needs, the same for all", () => {
    expect(formatCorners([WANTED, [8.5, 54]], "decimal")).toBe("54.412° N 8.231° W\n54.000° N 8.500° E");
    expect(formatCorners([[8.12345, 54]], "decimal")).toBe("54.00000° N 8.12345° E");
    expect(formatCorners([], "minutes")).toBe("");
  });
});

describe("formatPosition", () => {
  it("writes latitude first with letters", () => {
    expect(formatPosition(WANTED)).toBe("54.412° N 8.231° W");
    expect(formatPosition(WANTED, "minutes")).toBe("54° 24.72′ N 8° 13.86′ W");
    expect(formatPosition(WANTED, "seconds")).toBe("54° 24′ 43.2″ N 8° 13′ 51.6″ W");
  });

  it("carries instead of writing 60 minutes or seconds", () => {
    expect(formatPosition([7.9999999, -0.99999999], "minutes")).toBe("1° 00.00′ S 8° 00.00′ E");
    expect(formatPosition([7.9999999, -0.99999999], "seconds")).toBe("1° 00′ 00.0″ S 8° 00′ 00.0″ E");
  });

  it("brings longitudes of other turns home", () => {
    expect(formatPosition([188.5, 1])).toBe("1.000° N 171.500° W");
  });
});
