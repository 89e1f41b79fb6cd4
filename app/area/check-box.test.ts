import { describe, expect, it } from "vitest";
import { type BoxProblemCode, checkBox } from "./check-box";
import type { Position } from "~/ocean/scenario";

const good: Position[] = [
  [-8.3, 54.3],
  [-8.1, 54.3],
  [-8.1, 54.4],
  [-8.3, 54.4],
];

function codes(candidate: unknown): BoxProblemCode[] {
  const checked = checkBox(candidate);
  return checked.ok ? checked.warnings.map(({ code }) => code) : checked.problems.map(({ code }) => code);
}

describe("checkBox", () => {
  it("closes a sound ring and gives it back", () => {
    expect(checkBox(good)).toEqual({ ok: true, ring: [...good, good[0]], warnings: [] });
  });

  it.each<[string, unknown, BoxProblemCode]>([
    ["no list", "54, 8", "notARing"],
    ["nothing", null, "notARing"],
    ["an empty list", [], "fewCorners"],
    ["two corners", good.slice(0, 2), "fewCorners"],
    ["three corners of which two are one place", [good[0], good[1], good[1]], "fewCorners"],
    ["text for a number", [["8", 54], good[1], good[2]], "notANumber"],
    ["a corner of one number", [[8], good[1], good[2]], "notANumber"],
    ["infinity", [[Infinity, 54], good[1], good[2]], "notANumber"],
    ["too many corners", Array.from({ length: 600 }, (_, i) => [i / 1000, i / 2000]), "manyCorners"],
    ["a latitude beyond the pole", [[8, 91], good[1], good[2]], "latitudeRange"],
    ["a longitude of two turns", [[400, 54], good[1], good[2]], "longitudeRange"],
    [
      "corners on one line",
      [
        [0, 50],
        [1, 50],
        [2, 50],
      ],
      "noArea",
    ],
    [
      "a polar box",
      [
        [0, 84],
        [1, 84],
        [1, 86],
        [0, 86],
      ],
      "pole",
    ],
    [
      "a ring round the pole",
      [
        [0, 80],
        [120, 80],
        [-120, 80],
      ],
      "pole",
    ],
    [
      "a box 6 degrees wide",
      [
        [0, 50],
        [6, 50],
        [6, 51],
        [0, 51],
      ],
      "tooWide",
    ],
    [
      "a box 6 degrees tall",
      [
        [0, 50],
        [1, 50],
        [1, 56],
        [0, 56],
      ],
      "tooTall",
    ],
    [
      "a side that folds back",
      [
        [0, 50],
        [2, 50],
        [1, 50],
        [1, 51],
      ],
      "crossing",
    ],
    [
      "a side through another corner",
      [
        [0, 50],
        [2, 50],
        [2, 51],
        [1, 50],
        [0, 51],
      ],
      "crossing",
    ],
  ])("refuses %s", (_, candidate, code) => {
    expect(checkBox(candidate).ok).toBe(false);
    expect(codes(candidate)).toEqual([code]);
  });

  it("names the sides that cross by their corners", () => {
    const checked = checkBox([good[0], good[2], good[1], good[3]]);
    expect(checked).toMatchObject({ ok: false, problems: [{ code: "crossing", field: "polygon[0]" }] });
    expect(!checked.ok && checked.problems[0].message).toMatch(/corners 1–2 meets .* corners 3–4/);
  });

  it("trap 36: says which corner is wrong and guesses a swap of latitude and longitude", () => {
    const checked = checkBox([good[0], [54.3, 108], good[2]]);
    expect(checked).toMatchObject({ ok: false, problems: [{ field: "polygon[1]", code: "latitudeRange" }] });
    expect(!checked.ok && checked.problems[0].message).toContain("swapped");
  });

  it("takes a box across the antimeridian in either way of writing longitudes", () => {
    const signed: Position[] = [
      [179.5, -17],
      [-179.5, -17],
      [-179.5, -16],
      [179.5, -16],
    ];
    const positive: Position[] = signed.map(([x, y]) => [x < 0 ? x + 360 : x, y]);
    expect(checkBox(signed)).toMatchObject({ ok: true, warnings: [] });
    expect(checkBox(positive)).toEqual(checkBox(signed));
  });

  it("trap 43: warns of the equator but accepts", () => {
    const astride: Position[] = [
      [0, -1],
      [1, -1],
      [1, 1],
      [0, 1],
    ];
    expect(checkBox(astride).ok).toBe(true);
    expect(codes(astride)).toEqual(["equator"]);
    expect(
      codes([
        [0, 0],
        [1, 0],
        [1, 1],
      ]),
    ).toEqual([]);
  });
});
