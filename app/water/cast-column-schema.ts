import { z } from "zod";
import type { UnitChoices } from "~/units/unit-choices";
import { columnName, columnSource, layerDepth } from "./water-schema";

/** What a cast's sheet asks beside the cast: how the column is called, where it comes from, and where its layer ends. */
export function castColumnSchema(units: UnitChoices) {
  return z.object({ name: columnName, source: columnSource, layerDepth: layerDepth(units).optional() });
}
