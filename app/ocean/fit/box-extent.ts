import { METRES_PER_DEGREE } from "../box/ring";
import { coriolis, inertialPeriod } from "../ekman/coriolis";
import { hours, thresholdSource, type Indicator } from "./fit-context";

const WIDE = 500_000;

/** Across a very large box the Coriolis parameter differs so much that inertial motion falls out of step. */
export const boxExtent: Indicator = ({ place }) => {
  if (place.size === null) return null;
  const width = `The box is about ${(place.size / 1000).toFixed(0)} km wide`;
  const note = {
    code: "BOX_EXTENT",
    value: place.size / 1000,
    threshold: WIDE / 1000,
    source: thresholdSource("fit-extent"),
  };
  if (place.size <= WIDE) {
    return { ...note, severity: "ok", message: `${width}: one latitude stands for all of it.` };
  }
  const message = `${width}, so inertial motion falls out of step across it (${periodsAcross(place.latitude, place.size)}), and one wind does not hold for all of it. Divide the box.`;
  return { ...note, severity: "caution", message };
};

/** Inertial periods at the two ends of a box as high as it is wide. */
function periodsAcross(latitude: number, size: number): string {
  const half = size / METRES_PER_DEGREE / 2;
  const [south, north] = [Math.max(-90, latitude - half), Math.min(90, latitude + half)].map(coriolis);
  const [first, last] = [inertialPeriod(south), inertialPeriod(north)];
  if (first === null || last === null || south * north < 0)
    return "it turns opposite ways on the two sides of the equator";
  return `periods of ${hours(first)} in the south and ${hours(last)} in the north`;
}
