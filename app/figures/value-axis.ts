import { toDisplay } from "~/units/format-quantity";
import { displayUnit } from "~/units/quantities";
import type { UnitChoices } from "~/units/unit-choices";
import { extremes } from "./extremes";
import { niceAxis, type NiceAxis } from "./nice-ticks";
import type { TimePanel } from "./time-panel";

/** A level this many times farther off than the data's own range is told in the caption, not drawn. */
const LEVEL_REACH = 3;

export interface ValueAxis extends NiceAxis {
  /** Those that the axis holds. */
  levels: NonNullable<TimePanel["levels"]>;
  /** Those too far off to draw. */
  levelsBeyond: NonNullable<TimePanel["levels"]>;
}

/** The vertical axis of a panel in display units. A flat line is given ten of its last decimals, so that noise stays noise. */
export function valueAxis(panel: TimePanel, units: UnitChoices, height: number): ValueAxis {
  const show = (value: number) => toDisplay(value, panel.quantity, units);
  const drawn = [...panel.lines.map((line) => line.values), ...(panel.band ? [panel.band.low, panel.band.high] : [])];
  const found = drawn.map((values) => extremes(values)).filter((each) => each !== null);
  let low = Math.min(...found.map((each) => show(each.min)));
  let high = Math.max(...found.map((each) => show(each.max)));
  if (found.length === 0) [low, high] = [0, 0];
  if (panel.zero) [low, high] = [Math.min(low, 0), Math.max(high, 0)];

  const least = 10 ** (1 - displayUnit(panel.quantity, units).decimals);
  const reach = LEVEL_REACH * Math.max(high - low, least);
  const near = (panel.levels ?? []).filter((level) => {
    const value = show(level.value);
    return value >= low - reach && value <= high + reach;
  });
  for (const level of near) [low, high] = [Math.min(low, show(level.value)), Math.max(high, show(level.value))];
  if (high - low < least) [low, high] = widen(low, high, least, panel.zero === true);

  return {
    ...niceAxis(low, high, Math.max(2, Math.floor(height / 26))),
    levels: near,
    levelsBeyond: (panel.levels ?? []).filter((level) => !near.includes(level)),
  };
}

function widen(low: number, high: number, least: number, zero: boolean): [number, number] {
  if (zero && low >= 0) return [low, low + least];
  const middle = (low + high) / 2;
  return [middle - least / 2, middle + least / 2];
}
