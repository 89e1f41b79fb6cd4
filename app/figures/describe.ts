/** Sentences for captions and alternative texts. */
import { formatQuantity, formatRange } from "~/units/format-quantity";
import { formatPeriod, formatTime } from "~/units/format-time";
import type { QuantityId } from "~/units/quantities";
import { extremes } from "./extremes";
import type { FigureContext } from "./figure-context";
import type { PanelLevel } from "./time-panel";

/** `2026-11-03 00:00 to 2026-11-08 00:00 UTC` */
export function periodOf(time: ArrayLike<number>, context: FigureContext): string {
  return formatPeriod(time[0] ?? Number.NaN, time[time.length - 1] ?? Number.NaN, context.zone);
}

/** `Rain rate 0.0 to 9.5 mm/h, highest 9.5 mm/h at 2026-11-04 20:00 UTC.` */
export function rangeSentence(
  name: string,
  quantity: QuantityId,
  time: ArrayLike<number>,
  values: ArrayLike<number>,
  context: FigureContext,
  extreme: "highest" | "lowest" | "both" = "highest",
): string {
  const found = extremes(values);
  if (found === null) return `${name}: no values.`;
  const at = (index: number) => formatTime(time[index] ?? null, context.zone);
  const text = (value: number) => formatQuantity(value, quantity, context.units).text;
  if (found.min === found.max) return `${name} ${text(found.min)} throughout.`;
  const parts = [`${name} ${formatRange(found.min, found.max, quantity, context.units)}`];
  if (extreme !== "highest") parts.push(`lowest ${text(found.min)} at ${at(found.minAt)}`);
  if (extreme !== "lowest") parts.push(`highest ${text(found.max)} at ${at(found.maxAt)}`);
  return `${parts.join(", ")}.`;
}

/** `33.6 g/kg at the start, 32.7 g/kg at the end.` */
export function endsSentence(quantity: QuantityId, values: ArrayLike<number>, context: FigureContext): string {
  const all = Array.from(values).filter((value) => Number.isFinite(value));
  const text = (value: number | undefined) => formatQuantity(value, quantity, context.units).text;
  return all.length === 0 ? "" : `${text(all[0])} at the start, ${text(all.at(-1))} at the end.`;
}

/** Says of levels that are too far off to be drawn where they are. */
export function beyondSentence(levels: PanelLevel[]): string | null {
  return levels.length === 0 ? null : `Off the axis: ${levels.map((level) => level.label).join(", ")}.`;
}

export function missingSentence(values: ArrayLike<number>, name: string): string | null {
  const missing = values.length - (extremes(values)?.count ?? 0);
  return missing === 0 ? null : `${name}: ${missing} of ${values.length} values missing.`;
}
