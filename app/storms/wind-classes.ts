import { niceAxis } from "~/figures/nice-ticks";
import { fromDisplay, toDisplay } from "~/units/format-quantity";
import type { UnitChoices } from "~/units/unit-choices";

const ABOUT = 6;

/**
 * Round classes of wind speed in the unit that the organisation reads it in.
 * @param peak m/s, the strongest that must find a class
 * @returns m/s, from which each class begins; the first is 0
 */
export function windClasses(peak: number, units: UnitChoices): number[] {
  const { ticks } = niceAxis(0, Math.max(toDisplay(peak, "windSpeed", units), 1), ABOUT);
  const bounds = ticks.map((tick) => fromDisplay(tick, "windSpeed", units));
  return bounds.filter((bound, index) => index === 0 || bound <= peak);
}
