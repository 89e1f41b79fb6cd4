import { MAX_ZOOM } from "~/area/cut-tiles";
import { basemapState, readStoredTile } from "~/area/tiles.server";
import type { Route } from "./+types/basemap-tile";

const ONE_YEAR = "public, max-age=31536000, immutable";

/** `GET /basemap/:z/:x/:y`: one vector tile of land. Open to everyone: it holds nothing of any organisation. */
export async function loader({ params, request }: Route.LoaderArgs): Promise<Response> {
  const address = tileAddress(params);
  if (!address) {
    return new Response(
      `No such tile. Ask for /basemap/zoom/column/row with whole numbers: zoom 0 to ${MAX_ZOOM}, column and row from 0 to 2^zoom - 1.\n`,
      { status: 400, headers: { "Content-Type": "text/plain; charset=utf-8" } },
    );
  }
  const tile = await readStoredTile(address.z, address.x, address.y);
  if (!tile) {
    // Open sea is as lasting as land; a basemap that is not there yet must be asked for again.
    const lasting = (await basemapState()).ready;
    return new Response(null, { status: 204, headers: { "Cache-Control": lasting ? ONE_YEAR : "no-store" } });
  }
  const headers = { "Cache-Control": ONE_YEAR, ETag: `"${tile.id}"` };
  if (request.headers.get("If-None-Match")?.includes(headers.ETag)) return new Response(null, { status: 304, headers });
  return new Response(new Uint8Array(tile.bytes), {
    headers: { ...headers, "Content-Type": "application/vnd.mapbox-vector-tile", "Content-Encoding": "gzip" },
  });
}

function tileAddress(params: { z?: string; x?: string; y?: string }): { z: number; x: number; y: number } | null {
  const [z, x, y] = [params.z, params.x, params.y].map((text) => (/^\d{1,3}$/.test(text ?? "") ? Number(text) : NaN));
  const across = 2 ** z;
  return z <= MAX_ZOOM && x < across && y < across ? { z, x, y } : null;
}
