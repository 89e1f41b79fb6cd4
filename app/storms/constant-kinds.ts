import type { ChannelName } from "~/readers/reading";
import { formatNumber, SPACE } from "~/units/format-quantity";
import { convertBack, MILLIMETRES_TO_INCHES } from "~/units/conversions";

/** What can be set to stand over the whole storm. */
export interface ConstantKind {
  id: string;
  channel: ChannelName;
  /** As in `constant rain 5 mm/h`. */
  name: string;
  unit: string;
  /** Times a value as written gives the channel's unit. */
  toSi: number;
  /** What may be written, in `unit`. */
  min: number;
  max: number;
}

/** Limits as for files, common practice, no source: beyond them a number is a slip, not a storm. */
export const CONSTANT_KINDS: readonly ConstantKind[] = [
  { id: "rain-mm", channel: "rain", name: "rain", unit: "mm/h", toSi: 1, min: 0, max: 500 },
  {
    id: "rain-in",
    channel: "rain",
    name: "rain",
    unit: "in/h",
    toSi: convertBack(1, MILLIMETRES_TO_INCHES),
    min: 0,
    max: 20,
  },
  { id: "heat", channel: "netHeat", name: "net heat into the sea", unit: "W/m²", toSi: 1, min: -2000, max: 1500 },
];

export function constantLabel(kind: ConstantKind, value: number): string {
  const decimals = (String(value).split(".")[1] ?? "").length;
  return `constant ${kind.name} ${formatNumber(value, decimals)}${SPACE}${kind.unit}`;
}
