/** In which system the coordinates of a shapefile are, told by its .prj, by a person, or by their size. */
import proj4 from "proj4";
import type { Position } from "~/ocean/scenario";
import type { ProblemList } from "../problem-list";
import type { Understood } from "../reading";
import type { ShapeAnswers, ShapeQuestion } from "./shape-reading";

/** West, south, east, north in the file's own unit. */
type Extent = [number, number, number, number];

const DEGREES = [
  { value: "EPSG:4326", label: "longitude and latitude, WGS 84" },
  { value: "EPSG:4269", label: "longitude and latitude, NAD 83" },
];
const UTM_ZONES = Array.from({ length: 60 }, (_, k) => k + 1).flatMap((zone) => [
  { value: `EPSG:${32600 + zone}`, label: `metres, UTM zone ${zone} north, WGS 84` },
  { value: `EPSG:${32700 + zone}`, label: `metres, UTM zone ${zone} south, WGS 84` },
]);
const METRES = [{ value: "EPSG:3857", label: "metres, web Mercator" }, ...UTM_ZONES];

/** Extent in the header of a .shp. Source: ESRI Shapefile Technical Description (1998), main file header. */
export function extentOf(shp: Uint8Array): Extent {
  const view = new DataView(shp.buffer, shp.byteOffset, shp.byteLength);
  const at = (offset: number) => view.getFloat64(offset, true);
  return [at(36), at(44), at(52), at(60)];
}

/** Asks for the system of a shapefile without its .prj, with those that its numbers can be in and where each puts it. */
export function systemQuestion(extent: Extent, { projection }: ShapeAnswers): ShapeQuestion {
  const [west, south, east, north] = extent.map(Math.abs);
  const candidates = Math.max(west, east) <= 360 && Math.max(south, north) <= 90 ? DEGREES : METRES;
  const options = candidates.flatMap(({ value, label }) => {
    const place = placeOf(extent, value);
    return place === null ? [] : [{ value, label, place }];
  });
  return {
    key: "projection",
    needed: !options.some(({ value }) => value === projection),
    message:
      "The shapefile came without its .prj, so its coordinates may be in any system. Which one puts it where it belongs? The map then shows it.",
    options,
    ...(projection !== undefined && { answer: projection }),
  };
}

/** Where a system puts the middle of the file; null where it cannot lie there. */
function placeOf([west, south, east, north]: Extent, system: string): Position | null {
  try {
    const [longitude, latitude] = proj4(system, "EPSG:4326", [(west + east) / 2, (south + north) / 2]);
    return Math.abs(latitude) <= 85 && Math.abs(longitude) <= 360 ? [longitude, latitude] : null;
  } catch {
    return null;
  }
}

/** Datums within a few metres of WGS 84, by their names in a .prj. */
const NEAR_WGS84 =
  /wgs|nad_?(?:19)?83|north_american_1983|etrs|gda|itrf|nzgd_?2000|sirgas|jgd|rgf|cgcs|hartebeesthoek/i;

/** Says which system the .prj names, and warns where its datum is not that of the map. */
export function statedSystem(prj: string, problems: ProblemList): Understood {
  const named = /^\s*[A-Z_]+\["([^"]+)"/.exec(prj)?.[1]?.replaceAll("_", " ");
  const datum = /DATUM\["([^"]+)"/.exec(prj)?.[1] ?? "";
  if (datum !== "" && !NEAR_WGS84.test(datum) && !/TOWGS84/i.test(prj)) {
    problems.add(
      "warning",
      "datumShift",
      `its datum, ${datum.replace(/^D_/, "").replaceAll("_", " ")}, may lie up to 200 m from WGS 84, and the shift may not be known here`,
      "Compare the outline with the coast on the map, or export the shapes in WGS 84.",
    );
  }
  return { what: "Projection", taken: named ?? "as its .prj says", confidence: "stated in the file" };
}
