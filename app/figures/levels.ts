import type { TriggerLevel } from "~/ocean/scenario";
import { formatQuantity, toDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import type { PanelLevel } from "./time-panel";

/** The client's limits on one quantity, labelled with as many decimals as the client gave (up to three). */
export function triggerLevels(
  triggers: readonly TriggerLevel[] | undefined,
  quantity: TriggerLevel["quantity"],
  units: UnitChoices,
): PanelLevel[] {
  const levels = (triggers ?? []).filter((trigger) => trigger.quantity === quantity);
  const values = new Set(levels.map((trigger) => trigger.value));
  return [...values].map((value) => ({ value, label: `trigger level ${levelText(value, quantity, units)}` }));
}

export function levelText(value: number, quantity: TriggerLevel["quantity"], units: UnitChoices): string {
  const shown = toDisplay(value, quantity, units);
  const given = [0, 1, 2, 3].find((decimals) => Math.abs(Number(shown.toFixed(decimals)) - shown) < 1e-9) ?? 3;
  const decimals = Math.max(given, displayUnit(quantity, units).decimals);
  return formatQuantity(value, quantity, units, { decimals }).text;
}
