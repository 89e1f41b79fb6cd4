import { parseDbf, parseShp } from "shpjs";
import type { ProblemList } from "../problem-list";
import { nameOf, type RawShapes } from "./raw-shapes";
import type { ShapeAnswers, ShapeQuestion } from "./shape-reading";

/** Systems that a shapefile without its .prj is most often in, as the projection library knows them. */
const CANDIDATES = [
  { value: "EPSG:4326", label: "longitude and latitude, WGS 84" },
  { value: "EPSG:4269", label: "longitude and latitude, NAD 83" },
  { value: "EPSG:3857", label: "metres, web Mercator" },
] as const;

export interface ShapefileParts {
  shp: Uint8Array;
  dbf: Uint8Array | null;
  /** Text of the .prj. */
  prj: string | null;
}

/**
 * Takes a shapefile apart and turns its coordinates to longitude and latitude by its .prj. Without one the person is asked.
 * @returns null where it cannot be read; `problems` says why
 */
export function shapefileShapes(parts: ShapefileParts, answers: ShapeAnswers, problems: ProblemList): RawShapes | null {
  const projection = parts.prj ?? answers.projection ?? null;
  try {
    const geometries = parseShp(parts.shp, projection ?? undefined);
    const records = parts.dbf ? parseDbf(parts.dbf) : [];
    return {
      features: geometries.map((geometry, index) => ({ name: nameOf(records[index]), geometry: geometry ?? null })),
      understood: [
        {
          what: "Projection",
          taken: parts.prj ? systemName(parts.prj) : (answers.projection ?? "longitude and latitude, WGS 84"),
          confidence: parts.prj ? "stated in the file" : answers.projection ? "answered" : "assumed",
        },
      ],
      questions: parts.prj ? [] : [projectionQuestion(answers)],
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

/** The name in the .prj's text. */
function systemName(prj: string): string {
  return /^\s*[A-Z]+\["([^"]+)"/.exec(prj)?.[1]?.replaceAll("_", " ") ?? "as its .prj says";
}

function projectionQuestion({ projection }: ShapeAnswers): ShapeQuestion {
  return {
    key: "projection",
    needed: projection === undefined,
    message:
      "The shapefile came without its .prj, so its coordinates may be in any system. Which one puts it where it belongs?",
    options: [...CANDIDATES],
    suggestion: CANDIDATES[0].value,
    ...(projection !== undefined && { answer: projection }),
  };
}
