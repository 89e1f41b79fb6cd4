import { TRIGGER_QUANTITY_IDS } from "./box-schema";
import type { TriggerLevel } from "~/ocean/scenario";
import { toDisplay } from "~/units/format-quantity";
import type { QuantityId } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";

interface StoredBox {
  name: string;
  waterDepth: number | null;
  shoreNormal: number | null;
  distanceToShore: number | null;
  triggerLevels: TriggerLevel[];
}

/** Twelve digits are all that a conversion there and back leaves sure. */
function shown(value: number, id: QuantityId, units: UnitChoices): number {
  return Number(toDisplay(value, id, units).toPrecision(12));
}

function shownIfKnown(value: number | null, id: QuantityId, units: UnitChoices): number | undefined {
  return value === null ? undefined : shown(value, id, units);
}

/** A stored box as its form shows it, in the organisation's units. */
export function boxFormValues(box: StoredBox, units: UnitChoices) {
  return {
    name: box.name,
    waterDepth: shownIfKnown(box.waterDepth, "depth", units),
    shoreNormal: box.shoreNormal ?? undefined,
    distanceToShore: shownIfKnown(box.distanceToShore, "distance", units),
    triggerLevels: box.triggerLevels.map((level) => ({
      ...level,
      value: shown(level.value, TRIGGER_QUANTITY_IDS[level.quantity], units),
    })),
  };
}
