import { decodeText } from "../decode-text";
import { ProblemList } from "../problem-list";
import { UnreadableFile } from "../reading";
import { isSizeAllowed } from "../source-file";
import { collectPolygons } from "./collect-polygons";
import { geoJsonShapes, isGeoJson } from "./geojson-shapes";
import { isKml, kmlShapes } from "./kml-shapes";
import { isArchive, openArchive } from "./open-archive";
import type { RawShapes } from "./raw-shapes";
import type { ShapeAnswers, ShapeReading } from "./shape-reading";
import { shapefileShapes } from "./shapefile-shapes";

/** Largest text of shapes that is read, bytes: a study area is small, and a text of millions of corners would keep others waiting. */
const MOST_TEXT = 16 * 1024 * 1024;

const WANTED = /\.(?:kml|shp|dbf|prj)$/i;

/** Whether a text is unmistakably a file of shapes. */
export function isShapeText(text: string): boolean {
  return isKml(text) || isGeoJson(text);
}

/** Whether bytes are those of a .shp file. */
export function isShapefile(bytes: Uint8Array): boolean {
  return bytes.length >= 100 && bytes[0] === 0 && bytes[1] === 0 && bytes[2] === 0x27 && bytes[3] === 0x0a;
}

/**
 * Reads polygons: GeoJSON, KML, KMZ, a shapefile zipped with its projection, or a .shp alone.
 * @param input.answers the same bytes, name and answers give the same reading
 * @returns polygons in longitude and latitude, degrees: at least one
 * @throws UnreadableFile where nothing can be read; its `problems` say why and what to do
 */
export function readShape(input: { bytes: Uint8Array; fileName: string; answers?: ShapeAnswers }): ShapeReading {
  const { bytes, fileName, answers = {} } = input;
  const problems = new ProblemList();
  const found = isSizeAllowed(bytes, fileName, problems) ? shapesOf(bytes, answers, problems) : null;
  if (!found?.raw) {
    if (problems.toArray().length === 0) {
      problems.add(
        "error",
        "noShape",
        `“${fileName}” is no file of shapes of a known form`,
        "Give GeoJSON, KML, KMZ, or a zip with a shapefile's .shp, .dbf and .prj.",
      );
    }
    throw new UnreadableFile(problems.toArray());
  }
  const { raw, format, formatLabel } = found;
  const collected = collectPolygons(raw, problems);
  if (collected.polygons.length === 0) throw new UnreadableFile(problems.toArray());
  return {
    kind: "shape",
    format,
    formatLabel,
    fileName,
    rows: raw.features.length,
    ...collected,
    understood: [{ what: "Format", taken: formatLabel, confidence: "by content" }, ...raw.understood],
    questions: raw.questions,
    problems: problems.toArray(),
  };
}

interface Found {
  format: string;
  formatLabel: string;
  raw: RawShapes | null;
}

function isTextAllowed(bytes: Uint8Array, problems: ProblemList): boolean {
  if (bytes.length <= MOST_TEXT) return true;
  const [size, most] = [bytes.length, MOST_TEXT].map((length) => Math.ceil(length / (1024 * 1024)));
  problems.add(
    "error",
    "tooLarge",
    `the shapes have ${size} MB of text; the limit is ${most} MB`,
    "Cut them to the study area.",
  );
  return false;
}

function shapesOf(bytes: Uint8Array, answers: ShapeAnswers, problems: ProblemList): Found | null {
  if (isShapefile(bytes)) {
    const raw = shapefileShapes({ shp: bytes, dbf: null, prj: null }, answers, problems);
    return { format: "shapefile", formatLabel: "shapefile, .shp alone", raw };
  }
  if (isArchive(bytes)) return shapesOfArchive(bytes, answers, problems);
  const text = isTextAllowed(bytes, problems) ? decodeText(bytes)?.text : undefined;
  if (text === undefined) return null;
  if (isKml(text)) return { format: "kml", formatLabel: "KML", raw: kmlShapes(text, problems) };
  if (isGeoJson(text)) return { format: "geoJson", formatLabel: "GeoJSON", raw: geoJsonShapes(text, problems) };
  return null;
}

function shapesOfArchive(bytes: Uint8Array, answers: ShapeAnswers, problems: ProblemList): Found | null {
  const files = openArchive(bytes, WANTED, problems);
  if (!files) return null;
  const names = [...files.keys()];
  const document = names.find((name) => /\.kml$/i.test(name));
  const read = (name: string | undefined) => (name === undefined ? null : (files.get(name) ?? null));
  const kmlBytes = read(document);
  if (kmlBytes) {
    if (!isTextAllowed(kmlBytes, problems)) return null;
    const text = decodeText(kmlBytes)?.text ?? "";
    return { format: "kmz", formatLabel: "KMZ", raw: kmlShapes(text, problems) };
  }
  const shapefiles = names.filter((name) => /\.shp$/i.test(name));
  const shp = read(shapefiles[0]);
  if (!shp) {
    problems.add(
      "error",
      "noShape",
      "the archive holds neither a .kml nor a .shp",
      "Zip the shapefile's parts, or give a KMZ.",
    );
    return null;
  }
  if (shapefiles.length > 1) {
    problems.add(
      "error",
      "severalShapefiles",
      `the archive holds ${shapefiles.length} shapefiles`,
      "Give one at a time.",
    );
    return null;
  }
  const stem = shapefiles[0].slice(0, -4).toLowerCase();
  const sibling = (ending: string) => read(names.find((name) => name.toLowerCase() === `${stem}.${ending}`));
  const prj = sibling("prj");
  const parts = { shp, dbf: sibling("dbf"), prj: prj && new TextDecoder().decode(prj) };
  return { format: "shapefileZip", formatLabel: "zipped shapefile", raw: shapefileShapes(parts, answers, problems) };
}
