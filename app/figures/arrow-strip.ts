import * as Plot from "@observablehq/plot";
import type { TimeFrame } from "./time-frame";
import type { TimePanel } from "./time-panel";

const SPACING = 26;
/** A mean of directions that cancel out says nothing: no arrow is drawn below this share of the mean speed. */
const LEAST_STEADINESS = 0.2;

interface StripArrow {
  seconds: number;
  towards: number;
}

/**
 * The vector mean of each stretch of time as an arrow.
 * @param arrows towards: degrees true; speed: any unit; both one a time, NaN where missing
 * @returns middles of the stretches in seconds; degrees true that the arrow points to
 */
export function meanArrows(
  time: ArrayLike<number>,
  arrows: NonNullable<TimePanel["arrows"]>,
  domain: [number, number],
  count: number,
): StripArrow[] {
  const [from, to] = domain;
  const sums = Array.from({ length: count }, () => ({ east: 0, north: 0, speed: 0 }));
  for (let index = 0; index < time.length; index += 1) {
    const speed = arrows.speed[index] ?? Number.NaN;
    const angle = ((arrows.towards[index] ?? Number.NaN) * Math.PI) / 180;
    const sum = sums[Math.min(count - 1, Math.floor((((time[index] ?? 0) - from) / (to - from)) * count))];
    if (sum === undefined || !Number.isFinite(speed + angle)) continue;
    sum.east += speed * Math.sin(angle);
    sum.north += speed * Math.cos(angle);
    sum.speed += speed;
  }
  return sums.flatMap(({ east, north, speed }, bin) =>
    Math.hypot(east, north) > LEAST_STEADINESS * speed
      ? [
          {
            seconds: from + ((bin + 0.5) / count) * (to - from),
            towards: ((Math.atan2(east, north) * 180) / Math.PI + 360) % 360,
          },
        ]
      : [],
  );
}

/** Arrows of one length beneath the frame: only their direction speaks. */
export function arrowStrip(arrows: NonNullable<TimePanel["arrows"]>, frame: TimeFrame, colour: string): Plot.Markish {
  const count = Math.max(1, Math.floor((frame.width - frame.marginLeft - frame.marginRight) / SPACING));
  return Plot.vector(meanArrows(frame.time, arrows, frame.domain, count), {
    x: "seconds",
    rotate: "towards",
    frameAnchor: "bottom",
    dy: 10,
    length: 12,
    r: 4.5,
    anchor: "middle",
    shape: "arrow",
    stroke: colour,
    strokeWidth: 1.25,
  });
}
