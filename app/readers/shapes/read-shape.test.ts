import { strToU8, zipSync } from "fflate";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { UnreadableFile } from "../reading";
import { readShape } from "./read-shape";
import type { ShapeAnswers } from "./shape-reading";

const read = (bytes: Uint8Array | string, answers?: ShapeAnswers) =>
  readShape({
    bytes: typeof bytes === "string" ? strToU8(bytes) : bytes,
    fileName: "area",
    ...(answers && { answers }),
  });

const SQUARE = [
  [10, 50],
  [10, 51],
  [11, 51],
  [11, 50],
  [10, 50],
];
const HOLE = [
  [10.2, 50.2],
  [10.4, 50.2],
  [10.4, 50.4],
  [10.2, 50.2],
];
const feature = (geometry: unknown, properties: unknown = { name: "Lease" }) => ({
  type: "Feature",
  properties,
  geometry,
});
const collection = (...features: unknown[]) => JSON.stringify({ type: "FeatureCollection", features });
const square = (holes: number[][][] = []) => ({ type: "Polygon", coordinates: [SQUARE, ...holes] });

const ring = (corners: number[][]) => corners.map(([x, y]) => `${x},${y},7`).join(" ");
const kmlOf = (inner: string) =>
  `<?xml version="1.0"?><kml xmlns="http://www.opengis.net/kml/2.2"><Document>${inner}</Document></kml>`;
const placemark = (holes = "") =>
  `<Placemark><name>Lease &amp; quay</name><Polygon><outerBoundaryIs><LinearRing><coordinates>${ring(SQUARE)}</coordinates></LinearRing></outerBoundaryIs>${holes}</Polygon></Placemark>`;

/** A shapefile of one polygon, by the published description of the format. */
function shpOf(corners: number[][], type = 5): Uint8Array {
  const content = 44 + 4 + 16 * corners.length;
  const view = new DataView(new ArrayBuffer(100 + 8 + content));
  view.setInt32(0, 9994);
  view.setInt32(24, view.byteLength / 2);
  view.setInt32(28, 1000, true);
  view.setInt32(32, type, true);
  const xs = corners.map(([x]) => x);
  const ys = corners.map(([, y]) => y);
  const box = [Math.min(...xs), Math.min(...ys), Math.max(...xs), Math.max(...ys)];
  box.forEach((value, k) => view.setFloat64(36 + 8 * k, value, true));
  view.setInt32(100, 1);
  view.setInt32(104, content / 2);
  view.setInt32(108, type, true);
  box.forEach((value, k) => view.setFloat64(112 + 8 * k, value, true));
  view.setInt32(144, 1, true);
  view.setInt32(148, corners.length, true);
  view.setInt32(152, 0, true);
  corners.forEach(([x, y], k) => {
    view.setFloat64(156 + 16 * k, x, true);
    view.setFloat64(164 + 16 * k, y, true);
  });
  return new Uint8Array(view.buffer);
}

const WGS84 =
  'GEOGCS["GCS_WGS_1984",DATUM["D_WGS_1984",SPHEROID["WGS_1984",6378137.0,298.257223563]],PRIMEM["Greenwich",0.0],UNIT["Degree",0.0174532925199433]]';
const MERCATOR_ZONE =
  'PROJCS["WGS_1984_UTM_Zone_32N",GEOGCS["GCS_WGS_1984",DATUM["D_WGS_1984",SPHEROID["WGS_1984",6378137.0,298.257223563]],PRIMEM["Greenwich",0.0],UNIT["Degree",0.0174532925199433]],PROJECTION["Transverse_Mercator"],PARAMETER["False_Easting",500000.0],PARAMETER["False_Northing",0.0],PARAMETER["Central_Meridian",9.0],PARAMETER["Scale_Factor",0.9996],PARAMETER["Latitude_Of_Origin",0.0],UNIT["Meter",1.0]]';

describe("shapes", () => {
  it("trap 41: rings are opened and turned anticlockwise, holes and parts kept apart", () => {
    const { polygons, summary } = read(
      collection(feature(square([HOLE])), feature({ type: "MultiPolygon", coordinates: [[SQUARE], [SQUARE]] }, {})),
    );
    expect(polygons.map(({ name }) => name)).toEqual(["Lease", "Shape 2, part 1", "Shape 3, part 2"]);
    expect(polygons[0].outer).toEqual([
      [11, 50],
      [11, 51],
      [10, 51],
      [10, 50],
    ]);
    expect(polygons[0].holes).toHaveLength(1);
    expect(summary).toEqual({ polygons: 3, holes: 1, vertices: 19, bbox: [10, 50, 11, 51] });
  });

  it("trap 40: a crs member of another system is refused, WGS 84 is not", () => {
    const withCrs = (name: string) =>
      JSON.stringify({ type: "FeatureCollection", crs: { properties: { name } }, features: [feature(square())] });
    expect(() => read(withCrs("urn:ogc:def:crs:EPSG::32632"))).toThrow(/another system/);
    expect(read(withCrs("urn:ogc:def:crs:OGC:1.3:CRS84")).polygons).toHaveLength(1);
  });

  it("trap 40: metres read as degrees are pointed out", () => {
    const metres = { type: "Polygon", coordinates: [SQUARE.map(([x, y]) => [x * 50_000, y * 100_000])] };
    expect(read(collection(feature(metres))).problems.find(({ code }) => code === "notDegrees")?.severity).toBe(
      "error",
    );
  });

  it("lines and points are refused with the reason where there is no polygon, and left out beside one", () => {
    const line = { type: "LineString", coordinates: SQUARE };
    expect(() => read(collection(feature(line)))).toThrow(/no polygon: it holds 1 lines/);
    expect(read(collection(feature(line), feature(square()))).problems[0]).toMatchObject({
      code: "otherShapes",
      severity: "note",
    });
  });

  it("trap 37: KML is longitude, latitude; names, holes, heights, several geometries in one placemark", () => {
    const holes = `<innerBoundaryIs><LinearRing><coordinates>${ring(HOLE)}</coordinates></LinearRing></innerBoundaryIs>`;
    const { polygons, problems, format } = read(kmlOf(placemark(holes)));
    expect(format).toBe("kml");
    expect(polygons[0]).toMatchObject({ name: "Lease & quay" });
    expect(polygons[0].holes).toHaveLength(1);
    expect(polygons[0].outer[0]).toHaveLength(2);
    expect(problems.map(({ code }) => code)).toEqual(["heights"]);
  });

  it("security: entities are refused unread, links to other documents not followed", () => {
    const bomb = `<!DOCTYPE kml [<!ENTITY a "ha"><!ENTITY b "&a;&a;">]>${kmlOf(placemark())}`;
    expect(() => read(bomb)).toThrow(/declares entities/);
    const linked = kmlOf(
      `${placemark()}<NetworkLink><Link><href>http://example.invalid/x.kml</href></Link></NetworkLink>`,
    );
    expect(read(linked).problems.some(({ code }) => code === "networkLink")).toBe(true);
  });

  it("KMZ and a zipped shapefile are opened, whatever else lies in the archive", () => {
    expect(read(zipSync({ "images/a.png": new Uint8Array(5), "doc.kml": strToU8(kmlOf(placemark())) })).format).toBe(
      "kmz",
    );
    const zipped = zipSync({
      "a/lease.shp": shpOf(SQUARE),
      "a/lease.prj": strToU8(WGS84),
      "a/readme.txt": strToU8("x"),
    });
    const { polygons, questions, understood } = read(zipped);
    expect(polygons[0].outer).toHaveLength(4);
    expect(questions).toEqual([]);
    expect(understood.find(({ what }) => what === "Projection")?.taken).toBe("GCS WGS 1984");
    expect(() => read(zipSync({ "a.txt": strToU8("x") }))).toThrow(/neither a .kml nor a .shp/);
  });

  it("a projected shapefile comes out in longitude and latitude", () => {
    // 500 km east is the central meridian of the zone; a degree of latitude along it is 110.6 to 111.7 km.
    const metres = [
      [500_000, 5_540_000],
      [500_000, 5_550_000],
      [510_000, 5_550_000],
      [510_000, 5_540_000],
      [500_000, 5_540_000],
    ];
    const { polygons } = read(zipSync({ "b.shp": shpOf(metres), "b.prj": strToU8(MERCATOR_ZONE) }));
    const west = polygons[0].outer.filter(([x]) => Math.abs(x - 9) < 1e-9);
    expect(west).toHaveLength(2);
    expect(Math.abs(west[0][1] - west[1][1]) * 111.2).toBeCloseTo(10, 1);
  });

  it("trap 40: a shapefile without its .prj is asked about, with candidates, and the answer is used", () => {
    const bare = shpOf(SQUARE);
    expect(read(bare).questions[0]).toMatchObject({ key: "projection", needed: true });
    expect(read(bare).questions[0].options.map(({ value }) => value)).toEqual(["EPSG:4326", "EPSG:4269"]);
    expect(read(bare).questions[0].options[0].place).toEqual([10.5, 50.5]);
    const metres = shpOf(SQUARE.map(([x, y]) => [x * 111_319.49, y * 130_000]));
    const answered = read(metres, { projection: "EPSG:3857" });
    expect(answered.polygons[0].outer[0][0]).toBeCloseTo(11, 3);
    expect(answered.questions[0].needed).toBe(false);
    const labels = answered.questions[0].options.map(({ label }) => label);
    expect(labels.slice(0, 2)).toEqual(["metres, web Mercator", "metres, UTM zone 1 north, WGS 84"]);
    expect(read(metres, { projection: "+proj=utm +zone=32" }).questions[0].needed).toBe(true);
  });

  it("a zone of metres is one of the candidates, and puts the shape where it belongs", () => {
    // The central meridian of zone 32 is 9° E (500 km east); 5 540 km north is near 50° N.
    const metres = shpOf(SQUARE.map(([x, y]) => [500_000 + 1000 * (x - 10), 5_540_000 + 1000 * (y - 50)]));
    const { polygons, questions } = read(metres, { projection: "EPSG:32632" });
    expect(questions[0].needed).toBe(false);
    expect(polygons[0].outer[0][0]).toBeCloseTo(9, 1);
    expect(polygons[0].outer[0][1]).toBeCloseTo(50, 1);
  });

  it("warns of a datum that is not that of the map", () => {
    const old = WGS84.replaceAll("WGS_1984", "North_American_1927");
    const zipped = (prj: string) => zipSync({ "a.shp": shpOf(SQUARE), "a.prj": strToU8(prj) });
    expect(read(zipped(old)).problems[0]).toMatchObject({ code: "datumShift", severity: "warning" });
    expect(read(zipped(old)).problems[0].message).toContain("North American 1927");
    expect(read(zipped(WGS84)).problems).toEqual([]);
  });

  it("trap 39: a ring across the antimeridian keeps its sense, whichever turn its longitudes are in", () => {
    const across = (east: number) => [
      [179, -17],
      [east, -17],
      [east, -16],
      [179, -16],
      [179, -17],
    ];
    for (const east of [181, -179]) {
      const { polygons } = read(collection(feature({ type: "Polygon", coordinates: [across(east)] })));
      expect(polygons[0].outer).toEqual(across(east).slice(0, -1));
      const clockwise = [...across(east)].reverse();
      const turned = read(collection(feature({ type: "Polygon", coordinates: [clockwise] }))).polygons[0].outer;
      expect(turned).toEqual([...clockwise.slice(0, -1)].reverse());
    }
  });

  it("security: an archive that would swell is refused unread, and so is a text too long", () => {
    const swelling = zipSync({ "a.kml": new Uint8Array(140 * 1024 * 1024) });
    expect(swelling.length).toBeLessThan(1024 * 1024);
    expect(() => read(swelling)).toThrow(/would unpack to 140 MB/);
    expect(() => read(zipSync({ "a.kml": new Uint8Array(20 * 1024 * 1024) }))).toThrow(/20 MB of text/);
    expect(() => read(new Uint8Array(17 * 1024 * 1024).fill(32))).toThrow(/17 MB of text/);
    const deep = `{"type":"FeatureCollection","crs":${"[".repeat(200_000)}${"]".repeat(200_000)},"features":[]}`;
    expect(() => read(deep)).toThrow(/another system|not JSON/);
  });

  it("says why what is none cannot be read", () => {
    expect(() => read('{not json, but a "type": "FeatureCollection"')).toThrow(/not JSON/);
    expect(() =>
      read(
        '{"type":"FeatureCollection","features":[{"type":"Feature","geometry":{"type":"Polygon","coordinates":[[["a"]]]}}]}',
      ),
    ).toThrow(/RFC 7946/);
    expect(() => read("time,wind\n1,2")).toThrow(/no file of shapes/);
    expect(() => read(kmlOf("<Placemark>"))).toThrow(/not well formed/);
  });

  it("gives shapes or a refusal for files with bytes changed", () => {
    const files = [
      strToU8(collection(feature(square([HOLE])))),
      strToU8(kmlOf(placemark())),
      zipSync({ "lease.shp": shpOf(SQUARE), "lease.prj": strToU8(WGS84) }),
      shpOf(SQUARE),
    ];
    for (const good of files) {
      fc.assert(
        fc.property(
          fc.array(fc.tuple(fc.nat(good.length - 1), fc.nat(255)), { minLength: 1, maxLength: 8 }),
          (changes) => {
            const bytes = good.slice();
            for (const [at, byte] of changes) bytes[at] = byte;
            try {
              expect(read(bytes).kind).toBe("shape");
            } catch (error) {
              expect(error).toBeInstanceOf(UnreadableFile);
            }
          },
        ),
        { seed: 9, numRuns: 150 },
      );
    }
  });
});
