import { PbfWriter } from "pbf";
import { LAND_LAYER } from "./basemap";
import { TILE_EXTENT, type TileRings } from "./cut-tiles";

/** Field numbers of the vector tile specification 2.1 (github.com/mapbox/vector-tile-spec). */
const FIELD = { tileLayer: 3, layerName: 1, layerFeature: 2, layerExtent: 5, layerVersion: 15, type: 3, geometry: 4 };
const POLYGON = 3;
const COMMAND = { moveTo: 1, lineTo: 2, closePath: 7 };

/**
 * Encodes land as a vector tile: one layer `land`, one polygon feature without attributes.
 * @param rings tile units; outer rings clockwise on the screen, each followed by its holes; first point repeated last
 */
export function encodeLandTile(rings: TileRings): Uint8Array {
  const tile = new PbfWriter();
  tile.writeMessage(
    FIELD.tileLayer,
    (_, layer) => {
      layer.writeVarintField(FIELD.layerVersion, 2);
      layer.writeStringField(FIELD.layerName, LAND_LAYER);
      layer.writeMessage(FIELD.layerFeature, writeFeature, rings);
      layer.writeVarintField(FIELD.layerExtent, TILE_EXTENT);
    },
    null,
  );
  return tile.finish();
}

function writeFeature(rings: TileRings, feature: PbfWriter): void {
  feature.writeVarintField(FIELD.type, POLYGON);
  feature.writePackedVarint(FIELD.geometry, drawingCommands(rings));
}

/** The pen is moved by differences, and is not moved back when a ring is closed. */
function drawingCommands(rings: TileRings): number[] {
  const commands: number[] = [];
  let penX = 0;
  let penY = 0;
  for (const ring of rings) {
    const corners = ring.length - 1;
    for (let i = 0; i < corners; i++) {
      if (i === 0) commands.push(command(COMMAND.moveTo, 1));
      if (i === 1) commands.push(command(COMMAND.lineTo, corners - 1));
      const [x, y] = ring[i];
      commands.push(zigzag(x - penX), zigzag(y - penY));
      penX = x;
      penY = y;
    }
    commands.push(command(COMMAND.closePath, 1));
  }
  return commands;
}

function command(id: number, count: number): number {
  return (count << 3) | id;
}

function zigzag(value: number): number {
  return (value << 1) ^ (value >> 31);
}
