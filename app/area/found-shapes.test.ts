import { describe, expect, it } from "vitest";
import { foundShapes, MOST_SHAPES, readChosenShapes, shapesOfForm } from "./found-shapes";
import type { Position } from "~/ocean/scenario";
import { DEFAULT_UNITS } from "~/units/unit-choices";

const square: Position[] = [
  [-8, 51],
  [-7.9, 51],
  [-7.9, 51.1],
  [-8, 51.1],
];
const polygon = (outer: Position[], holes: Position[][] = [], name = "Lease") => ({ name, outer, holes });

function formOf(fields: Record<string, string>): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return form;
}

describe("found shapes", () => {
  it("with too many corners are thinned only where that is agreed to, and say how far they move", () => {
    const many = Array.from({ length: 2000 }, (_, k): Position => {
      const angle = (2 * Math.PI * k) / 2000;
      return [-8 + 0.05 * Math.cos(angle), 51 + 0.03 * Math.sin(angle)];
    });
    const [shape] = foundShapes({ polygons: [polygon(many)] }, DEFAULT_UNITS);
    expect(shape).toMatchObject({ problems: [], taken: false });
    expect(shape.facts).toMatch(/^2000 corners/);
    expect(shape.change).toMatch(/at most 500 corners.*keeps \d{2,3} of them.*moves by less than [\d.]+\sm\.$/);
  });

  it("say what each is, and why one cannot be a study box", () => {
    const huge = square.map(([x, y]): Position => [x * 4, y]);
    const bow: Position[] = [square[0], square[2], square[1], square[3]];
    const [good, holed, wide, crossed] = foundShapes(
      {
        polygons: [
          polygon(square),
          polygon(square, [square]),
          polygon(huge.map(([x], k): Position => [x + (k % 3 ? 9 : 0), 51 + k / 9])),
          polygon(bow),
        ],
      },
      DEFAULT_UNITS,
    );
    expect(good).toMatchObject({ name: "Lease", problems: [] });
    expect(good.facts).toMatch(/^4 corners, [\d.]+\skm²$/);
    expect(holed.facts).toContain("1 hole, which will be filled");
    expect(wide.problems[0]).toContain("at most 5°");
    expect(crossed.problems[0]).toContain("meets the side");
  });

  it("are no more than a person can choose from", () => {
    expect(foundShapes({ polygons: Array.from({ length: 300 }, () => polygon(square)) }, DEFAULT_UNITS)).toHaveLength(
      MOST_SHAPES,
    );
  });
});

describe("chosen shapes", () => {
  it("come back as they were sent where the form is refused", () => {
    const ring = JSON.stringify(square);
    const sent = formOf({ "take-0": "on", "name-0": "North", "ring-0": ring, "name-1": "South", "ring-1": ring });
    const back = shapesOfForm(sent, DEFAULT_UNITS);
    expect(back.map(({ name, taken }) => [name, taken])).toEqual([
      ["North", true],
      ["South", false],
    ]);
    expect(shapesOfForm(formOf({ "ring-0": "[[", "name-0": "x" }), DEFAULT_UNITS)).toEqual([]);
  });

  it("are those that were ticked, with the name that was given", () => {
    const ring = JSON.stringify(square);
    const { shapes, errors } = readChosenShapes(
      formOf({ "take-0": "on", "name-0": " North lease ", "ring-0": ring, "name-1": "South", "ring-1": ring }),
    );
    expect(errors).toEqual({});
    expect(shapes).toEqual([{ name: "North lease", ring: square }]);
  });

  it("need a name, and corners that came back whole", () => {
    const { shapes, errors } = readChosenShapes(
      formOf({
        "take-0": "on",
        "name-0": " ",
        "ring-0": JSON.stringify(square),
        "take-1": "on",
        "name-1": "x",
        "ring-1": "[[",
      }),
    );
    expect(shapes).toEqual([]);
    expect(errors).toEqual({ "name-0": ["Name the box."], "name-1": ["Its corners were lost: bring the file again."] });
  });
});
