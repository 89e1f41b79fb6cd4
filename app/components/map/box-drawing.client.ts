import type { Map as MapLibreMap } from "maplibre-gl";
import {
  type GeoJSONStoreFeatures,
  TerraDraw,
  TerraDrawPolygonMode,
  TerraDrawRectangleMode,
  TerraDrawSelectMode,
} from "terra-draw";
import type { DrawingTool } from "./box-editor";
import type { MapColours } from "./map-colours.client";
import { DRAWING_DECIMALS, ShiftedAdapter } from "./shifted-adapter.client";
import { unwrapRing, wrapLongitude } from "~/area/ring";
import { type DrawnRing, sameRing } from "~/area/ring-history";
import type { Position } from "~/ocean/scenario";

export interface DrawingEvents {
  onPreview(ring: DrawnRing): void;
  onCommit(ring: DrawnRing): void;
  /** A shape was finished: the next thing is to change it. */
  onDrawn(): void;
}

/** Pixels: 24 across, so that fingers find the handles. */
const HANDLE_RADIUS = 12;
const MIDPOINT_RADIUS = 8;
const REACH = 24;

/** One box on the map under the pointer's hands: draws it, moves its corners, and reports corners both ways. */
export class BoxDrawing {
  private readonly draw: TerraDraw;
  private readonly meridian: number;
  private readonly events: DrawingEvents;
  private shown: DrawnRing = null;
  /** While the map is made to follow, its own reports would only echo. */
  private following = false;

  /** @param meridian longitude near the work, degrees: the drawing counts from here */
  constructor(map: MapLibreMap, meridian: number, colours: MapColours, events: DrawingEvents) {
    this.meridian = meridian;
    this.events = events;
    const outline = { outlineColor: colours.ink, outlineWidth: 2.5, outlineOpacity: 1 };
    const fill = { fillColor: colours.ink, fillOpacity: 0.08 };
    this.draw = new TerraDraw({
      adapter: new ShiftedAdapter(map, meridian),
      modes: [
        new TerraDrawRectangleMode({ drawInteraction: "click-move-or-drag", styles: { ...fill, ...outline } }),
        new TerraDrawPolygonMode({
          pointerDistance: REACH,
          styles: {
            ...fill,
            ...outline,
            closingPointWidth: HANDLE_RADIUS,
            closingPointColor: colours.paper,
            closingPointOutlineColor: colours.ink,
            closingPointOutlineWidth: 2,
          },
        }),
        new TerraDrawSelectMode({
          pointerDistance: REACH,
          // Keys are the editor's: its undo must know of every change.
          keyEvents: null,
          allowManualDeselection: false,
          flags: { polygon: editable(true), rectangle: editable("opposite") },
          styles: {
            selectedPolygonColor: colours.ink,
            selectedPolygonFillOpacity: 0.08,
            selectedPolygonOutlineColor: colours.ink,
            selectedPolygonOutlineWidth: 2.5,
            selectionPointColor: colours.paper,
            selectionPointWidth: HANDLE_RADIUS,
            selectionPointOutlineColor: colours.ink,
            selectionPointOutlineWidth: 2,
            midPointColor: colours.paper,
            midPointWidth: MIDPOINT_RADIUS,
            midPointOutlineColor: colours.quiet,
            midPointOutlineWidth: 1.5,
          },
        }),
      ],
    });
    this.draw.start();
    this.draw.on("change", (_, type) => {
      if (type === "update" && this.draw.getMode() === "select") this.report(this.events.onPreview);
    });
    this.draw.on("finish", (id, { action }) => {
      if (action === "draw") {
        // The new shape takes the place of an earlier one.
        this.draw.removeFeatures(
          this.boxes().flatMap((box) => (box.id === undefined || box.id === id ? [] : [box.id])),
        );
        this.events.onDrawn();
      }
      this.report(this.events.onCommit);
    });
  }

  /**
   * Shows corners that came from elsewhere; those that the drawing itself reported are there already.
   * @returns the shape when it is new to the map
   */
  show(ring: DrawnRing): Position[] | null {
    if (sameRing(ring, this.shown)) return null;
    this.shown = ring;
    const drawable = ring !== null && ring.length >= 3;
    this.follow(() => {
      this.draw.clear();
      if (drawable) this.draw.addFeatures([{ ...this.toFeature(ring), id: this.draw.getFeatureId() }]);
      if (drawable && this.draw.getMode() === "select") this.select();
    });
    return drawable ? ring : null;
  }

  use(tool: DrawingTool): void {
    this.follow(() => {
      this.draw.setMode(tool === "edit" ? "select" : tool);
      if (tool === "edit") this.select();
    });
  }

  private follow(change: () => void): void {
    this.following = true;
    change();
    this.following = false;
  }

  stop(): void {
    this.draw.stop();
  }

  private select(): void {
    const [box] = this.boxes();
    if (box?.id !== undefined) this.draw.selectFeature(box.id);
  }

  private boxes(): GeoJSONStoreFeatures[] {
    return this.draw.getSnapshot().filter(({ geometry }) => geometry.type === "Polygon");
  }

  private report(to: (ring: DrawnRing) => void): void {
    const latest = this.boxes().at(-1);
    if (this.following || !latest || latest.geometry.type !== "Polygon") return;
    const ring = latest.geometry.coordinates[0]
      .slice(0, -1)
      .map(([longitude, latitude]): Position => [rounded(wrapLongitude(longitude + this.meridian)), rounded(latitude)]);
    this.shown = ring;
    to(ring);
  }

  private toFeature(ring: Position[]): GeoJSONStoreFeatures {
    const corners = unwrapRing([[this.meridian, 0], ...ring])
      .slice(1)
      .map(([longitude, latitude]): Position => [rounded(longitude - this.meridian), rounded(latitude)]);
    return {
      type: "Feature",
      properties: { mode: isUpright(corners) ? "rectangle" : "polygon" },
      geometry: { type: "Polygon", coordinates: [[...corners, corners[0]]] },
    };
  }
}

function editable(corners: true | "opposite") {
  return {
    feature: {
      draggable: true,
      coordinates:
        corners === "opposite"
          ? { resizable: corners }
          : { draggable: true, midpoints: { draggable: true }, deletable: true },
    },
  };
}

/** Whether four corners make a rectangle along meridians and parallels. */
function isUpright(corners: Position[]): boolean {
  if (corners.length !== 4) return false;
  return corners.every(([x, y], i) => {
    const [nextX, nextY] = corners[(i + 1) % 4];
    const [afterX, afterY] = corners[(i + 2) % 4];
    return (x === nextX && nextY === afterY) || (y === nextY && nextX === afterX);
  });
}

function rounded(degrees: number): number {
  return Number(degrees.toFixed(DRAWING_DECIMALS));
}
