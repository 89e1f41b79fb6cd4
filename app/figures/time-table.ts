import { toDisplay } from "~/units/format-quantity";
import { zoneClock } from "~/units/format-time";
import { displayUnit, type QuantityId } from "~/units/quantities";
import type { FigureTable } from "./figure";
import type { FigureContext } from "./figure-context";

export interface TableChannel {
  name: string;
  quantity: QuantityId;
  /** SI, one a time, NaN where missing. */
  values: ArrayLike<number>;
}

/** Every sample, unthinned, in the units and the time zone of the figure: ISO times with their offset. */
export function timeTable(time: ArrayLike<number>, channels: TableChannel[], context: FigureContext): FigureTable {
  const clock = zoneClock(context.zone);
  return {
    columns: [
      { name: `time (${clock.zone})`, unit: "" },
      ...channels.map(({ name, quantity }) => {
        const { unit, decimals } = displayUnit(quantity, context.units);
        return { name, unit, decimals: decimals + 1 };
      }),
    ],
    rows: Array.from({ length: time.length }, (_, index) => [
      clock.iso(time[index] ?? 0),
      ...channels.map((channel) =>
        finite(toDisplay(channel.values[index] ?? Number.NaN, channel.quantity, context.units)),
      ),
    ]),
  };
}

function finite(value: number): number | null {
  return Number.isFinite(value) ? value : null;
}
