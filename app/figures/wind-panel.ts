import type { QuantityId } from "~/units/quantities";
import { QUANTITIES } from "~/units/quantities";
import { extremes } from "./extremes";
import type { TimePanel } from "./time-panel";

export interface WindSeries {
  quantity: Extract<QuantityId, "windSpeed" | "windSpeed10">;
  heading: string;
  /** m/s */
  speed: ArrayLike<number>;
  /** degrees true, where the wind comes from */
  from: ArrayLike<number>;
  /** m/s */
  gust?: ArrayLike<number>;
}

/** Wind speed from zero, gusts dotted, and arrows that point where the wind blows to. */
export function windPanel({ quantity, heading, speed, from, gust }: WindSeries): TimePanel {
  return {
    quantity,
    heading,
    colour: "wind",
    lines: [
      { values: speed, label: "mean", openPauses: true },
      ...(gust ? [{ values: gust, label: "gust", dash: QUANTITIES.windGust.dash, openPauses: true }] : []),
    ],
    zero: true,
    marked: extremes(speed)?.maxAt,
    arrows: { speed, towards: Array.from(from, (degrees) => (degrees + 180) % 360) },
    height: 104,
  };
}
