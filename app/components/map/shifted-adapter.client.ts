import type { Position } from "geojson";
import type { Map as MapLibreMap } from "maplibre-gl";
import type { GeoJSONStoreFeatures, TerraDrawChanges, TerraDrawStylingFunction } from "terra-draw";
import { TerraDrawMapLibreGLAdapter } from "terra-draw-maplibre-gl-adapter";

/** Decimals of a degree that the drawing keeps: 0.1 m. */
export const DRAWING_DECIMALS = 6;

/**
 * The drawing knows no longitude beyond ±180°, so a box across the antimeridian would be torn. This adapter lets it
 * draw in longitudes counted from a meridian near the work, and shows the result where it belongs.
 */
export class ShiftedAdapter extends TerraDrawMapLibreGLAdapter<MapLibreMap> {
  private readonly meridian: number;

  constructor(map: MapLibreMap, meridian: number) {
    super({ map, coordinatePrecision: DRAWING_DECIMALS });
    this.meridian = meridian;
  }

  override project(lng: number, lat: number): { x: number; y: number } {
    return super.project(lng + this.meridian, lat);
  }

  /** Events find their place through here too. */
  override unproject(x: number, y: number): { lng: number; lat: number } {
    const { lng, lat } = super.unproject(x, y);
    return { lng: lng - this.meridian, lat };
  }

  override render(changes: TerraDrawChanges, styling: TerraDrawStylingFunction): void {
    const moved = (features: GeoJSONStoreFeatures[]) => features.map((feature) => this.inPlace(feature));
    super.render(
      {
        created: moved(changes.created),
        updated: moved(changes.updated),
        unchanged: moved(changes.unchanged),
        deletedIds: changes.deletedIds,
      },
      styling,
    );
  }

  private inPlace(feature: GeoJSONStoreFeatures): GeoJSONStoreFeatures {
    const shift = ([longitude, latitude]: Position): Position => [longitude + this.meridian, latitude];
    const { geometry } = feature;
    switch (geometry.type) {
      case "Point":
        return { ...feature, geometry: { ...geometry, coordinates: shift(geometry.coordinates) } };
      case "LineString":
        return { ...feature, geometry: { ...geometry, coordinates: geometry.coordinates.map(shift) } };
      case "Polygon":
        return {
          ...feature,
          geometry: { ...geometry, coordinates: geometry.coordinates.map((ring) => ring.map(shift)) },
        };
    }
  }
}
