declare module "shpjs" {
  import type { Geometry } from "geojson";
  /** Geometries of a .shp file, in WGS 84 where the text of its .prj is given. */
  export function parseShp(shp: Uint8Array, projection?: string): (Geometry | undefined)[];
  /** Attributes of a .dbf file, one record a geometry. */
  export function parseDbf(dbf: Uint8Array, codePage?: string): Record<string, unknown>[];
}
