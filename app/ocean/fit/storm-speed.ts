import { EQUATORIAL_LIMIT } from "../guards";
import { thresholdSource, type Indicator } from "./fit-context";
import { stormSpeedNumber } from "./storm-speed-number";

const SLOW = 0.5;
const FAST = 2;

/** How fast the wind of a passing cyclone turns against the inertial motion of the water. */
export const stormSpeed: Indicator = ({ scenario, place }) => {
  const { cyclone } = scenario.storm;
  if (!cyclone || Math.abs(place.latitude) < EQUATORIAL_LIMIT) return null;
  const value = stormSpeedNumber(cyclone.translationSpeed, cyclone.radiusOfMaximumWind, place.latitude);
  const note = { code: "STORM_SPEED_NUMBER", value, source: thresholdSource("fit-storm-speed") };
  const number = `The storm speed number is ${value.toFixed(2)}`;
  if (value < SLOW) {
    const message = `${number}: the storm is slow against the inertial motion, so water rises under it, which no model here follows. Expect more cooling than estimated.`;
    return { ...note, severity: "caution", message, threshold: SLOW };
  }
  if (value <= FAST) {
    const side = place.f > 0 ? "right" : "left";
    const message = `${number}: the wind turns about as fast as the inertial motion, so drift and cooling are strongest to the ${side} of the track. Make sure that the wind record is that of the box's own side of the track.`;
    return { ...note, severity: "ok", message, threshold: FAST };
  }
  const message = `${number}: the storm passes fast against the inertial motion, so it gives a push and the water swings on after it.`;
  return { ...note, severity: "ok", message, threshold: FAST };
};
