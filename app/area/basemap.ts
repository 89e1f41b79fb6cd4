/** What the builder, the server and the map all need to agree on about the basemap. */

/** Raised when the way of cutting changes: an older file is then cut anew and browsers fetch its tiles again. */
export const BASEMAP_RECIPE = "land-2";

/** Layer of the vector tiles that holds land as polygons. */
export const LAND_LAYER = "land";

export const BASEMAP_ATTRIBUTION = "© OpenStreetMap contributors, ODbL";

/** Address pattern of the tiles, relative to the origin. */
export const BASEMAP_TILES = `/basemap/{z}/{x}/{y}?v=${BASEMAP_RECIPE}`;
