import { EQUATORIAL_LIMIT } from "../guards";
import { kilometres, thresholdSource, type Indicator } from "./fit-context";
import { rossbyRadius } from "./rossby-radius";

const OPEN = 3;
const COASTAL = 1;
/** Speed of internal waves on a shelf where nothing is known of the water beneath, m/s. Common practice, no source. */
const USUAL_SPEED = 1;

/** Within an internal Rossby radius of the shore water wells up or sinks, and an open-sea drift does not hold. */
export const coastDistance: Indicator = ({ place, internalSpeed, method }) => {
  if (place.distanceToShore === null || Math.abs(place.latitude) < EQUATORIAL_LIMIT) return null;
  const radius = rossbyRadius(internalSpeed ?? USUAL_SPEED, place.latitude);
  const value = place.distanceToShore / radius;
  const reckoned = internalSpeed === null ? ", reckoned with internal waves of 1 m/s" : "";
  const distance = `The shore is ${kilometres(place.distanceToShore)} away`;
  const radii = `internal Rossby radius (${kilometres(radius)}${reckoned})`;
  const note = { code: "COAST_DISTANCE", value, source: thresholdSource("fit-coast") };
  if (value > OPEN) {
    const message = `${distance}, more than three times the ${radii}: open water for the drift.`;
    return { ...note, severity: "ok", message, threshold: OPEN };
  }
  if (value >= COASTAL) {
    const message = `${distance}, less than three times the ${radii}, so it begins to steer the drift. Read the transport towards and away from the shore with care.`;
    return { ...note, severity: "caution", message, threshold: OPEN };
  }
  if (method.model === "coastal") {
    const message = `${distance}, within one ${radii}: model coastal lets nothing through the shore but leaves out water that wells up or sinks beside it. Expect other temperatures and salinities close to the shore.`;
    return { ...note, severity: "caution", message, threshold: COASTAL };
  }
  const message = `${distance}, within one ${radii}, where the shore steers the drift and water wells up or sinks beside it. Use model coastal; it needs the water depth and the shore normal.`;
  return { ...note, severity: "doNotUse", message, threshold: COASTAL };
};
