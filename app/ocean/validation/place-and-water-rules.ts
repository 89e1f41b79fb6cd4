import type { ScenarioBox, ScenarioProblem, ScenarioWater } from "../scenario";
import { ringArea } from "../box/ring";

export function boxRules(box: ScenarioBox): ScenarioProblem[] {
  if (box.polygon) {
    if (box.polygon.length < 3) {
      return [{ path: "box.polygon", code: "INVALID_INPUT", message: "A polygon needs at least three corners." }];
    }
    if (!(ringArea(box.polygon) > 0)) {
      return [
        {
          path: "box.polygon",
          code: "INVALID_INPUT",
          message: "The polygon encloses no area; check the order of its corners.",
        },
      ];
    }
    return [];
  }
  if (box.latitude === undefined) {
    return [
      { path: "box.latitude", code: "INVALID_INPUT", message: "Give the box a polygon, or a latitude and longitude." },
    ];
  }
  return [];
}

export function waterRules(water: ScenarioWater): ScenarioProblem[] {
  if (!("cast" in water)) {
    const below = water.below ? salinityProblems(water.below, "water.below") : [];
    return [...salinityProblems(water, "water"), ...below];
  }
  const problems: ScenarioProblem[] = [];
  water.cast.forEach((level, k) => {
    problems.push(...salinityProblems(level, `water.cast[${k}]`));
    if (k > 0 && level.depth <= water.cast[k - 1].depth) {
      const message = `${level.depth} m is not deeper than the level before it (${water.cast[k - 1].depth} m); sort the cast by depth.`;
      problems.push({ path: `water.cast[${k}].depth`, code: "INVALID_INPUT", message });
    }
  });
  return problems;
}

function salinityProblems(level: { salinity?: number; practicalSalinity?: number }, path: string): ScenarioProblem[] {
  const absolute = level.salinity !== undefined;
  const practical = level.practicalSalinity !== undefined;
  if (absolute !== practical) return [];
  const message = absolute
    ? "Give either the Absolute Salinity (salinity) or the Practical Salinity (practicalSalinity), not both."
    : "Give the salinity in g/kg, or practicalSalinity.";
  return [{ path: `${path}.salinity`, code: "INVALID_INPUT", message }];
}
