import { parseDbf, parseShp } from "shpjs";
import type { ProblemList } from "../problem-list";
import { nameOf, type RawShapes } from "./raw-shapes";
import type { Understood } from "../reading";
import type { ShapeAnswers } from "./shape-reading";
import { extentOf, statedSystem, systemQuestion } from "./shapefile-system";

export interface ShapefileParts {
  shp: Uint8Array;
  dbf: Uint8Array | null;
  /** Text of the .prj. */
  prj: string | null;
}

/**
 * Takes a shapefile apart and turns its coordinates to longitude and latitude by its .prj. Without one the person is asked,
 * and nothing is taken for a place before.
 * @returns null where it cannot be read; `problems` says why
 */
export function shapefileShapes(parts: ShapefileParts, answers: ShapeAnswers, problems: ProblemList): RawShapes | null {
  try {
    const question = parts.prj === null ? systemQuestion(extentOf(parts.shp), answers) : null;
    const answered = question?.needed === false ? answers.projection : undefined;
    const geometries = parseShp(parts.shp, parts.prj ?? answered);
    const records = parts.dbf ? parseDbf(parts.dbf) : [];
    return {
      features: geometries.map((geometry, index) => ({ name: nameOf(records[index]), geometry: geometry ?? null })),
      understood: [parts.prj === null ? askedSystem(answered) : statedSystem(parts.prj, problems)],
      questions: question ? [question] : [],
    };
  } catch (error) {
    const reason = error instanceof Error ? `: ${error.message.slice(0, 120)}` : "";
    problems.add(
      "error",
      "badShapefile",
      `the shapefile cannot be read${reason}`,
      "Zip its .shp, .shx, .dbf and .prj anew.",
    );
    return null;
  }
}

function askedSystem(answered: string | undefined): Understood {
  return answered === undefined
    ? { what: "Projection", taken: "not known", confidence: "assumed" }
    : { what: "Projection", taken: answered, confidence: "answered" };
}
