import type { StormWindow } from "./storm-window";

/** The water needs this long to take up a wind, and as long to give it up again, in hours. Common practice, no source. */
const SPIN_UP_HOURS = 24;

/**
 * What a window cuts off of the storm inside it: its strongest wind may not stand at either edge.
 * @param peakAt seconds of the strongest wind in the window
 */
export function windowCautions({ startsAt, endsAt }: StormWindow, peakAt: number): string[] {
  const hours = (seconds: number) => `${Math.round(seconds / 3600)}\u00a0h`;
  const [before, after] = [peakAt - startsAt, endsAt - peakAt];
  return [
    ...(before < SPIN_UP_HOURS * 3600
      ? [
          `The window begins ${hours(before)} before its strongest wind: the water starts from rest, so give it ${SPIN_UP_HOURS}\u00a0h to spin up where the record allows.`,
        ]
      : []),
    ...(after < SPIN_UP_HOURS * 3600
      ? [
          `The window ends ${hours(after)} after its strongest wind: what follows the peak, inertial motion above all, is cut off.`,
        ]
      : []),
  ];
}
