import type { Geometry } from "geojson";
import type { Understood } from "../reading";
import type { ShapeQuestion } from "./shape-reading";

export interface NamedShape {
  name: string;
  geometry: Geometry | null;
}

/** What one of the forms yields: geometries in longitude and latitude, with their names. */
export interface RawShapes {
  features: NamedShape[];
  understood: Understood[];
  questions: ShapeQuestion[];
}

const NAME_KEYS = ["name", "Name", "NAME", "title", "label", "id", "ID"];

/** The name among a feature's attributes; empty where it has none. */
export function nameOf(properties: Record<string, unknown> | null | undefined): string {
  for (const key of NAME_KEYS) {
    const value = properties?.[key];
    if (typeof value === "string" && value.trim() !== "") return value.trim().slice(0, 120);
    if (typeof value === "number") return String(value);
  }
  return "";
}
