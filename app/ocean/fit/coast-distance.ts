import { EQUATORIAL_LIMIT } from "../guards";
import { CONVENTION, type Indicator } from "./fit-context";

const OPEN = 3;
const COASTAL = 1;
/** Speed of internal waves on a shelf where nothing is known of the water beneath, m/s. Common practice, no source. */
const USUAL_SPEED = 1;

/** Within an internal Rossby radius of the shore water wells up or sinks, and an open-sea drift does not hold. */
export const coastDistance: Indicator = ({ place, internalSpeed, method }) => {
  if (place.distanceToShore === null || Math.abs(place.latitude) < EQUATORIAL_LIMIT) return null;
  const radius = (internalSpeed ?? USUAL_SPEED) / Math.abs(place.f);
  const value = place.distanceToShore / radius;
  const reckoned = internalSpeed === null ? " (reckoned with 1 m/s, as the water beneath is not known)" : "";
  const distances = `The shore is ${(place.distanceToShore / 1000).toFixed(1)} km away, the internal Rossby radius ${(radius / 1000).toFixed(1)} km${reckoned}`;
  const note = {
    code: "COAST_DISTANCE",
    value,
    source: `internal Rossby radius (common practice); thresholds ${CONVENTION}`,
  };
  if (value > OPEN) return { ...note, severity: "ok", message: `${distances}: open water.`, threshold: OPEN };
  if (value >= COASTAL) {
    return {
      ...note,
      severity: "caution",
      message: `${distances}: the shore begins to steer the drift.`,
      threshold: OPEN,
    };
  }
  if (method.model === "coastal") {
    const message = `${distances}: coastal water, and this model lets nothing through the shore; upwelling beneath is not modelled.`;
    return { ...note, severity: "caution", message, threshold: COASTAL };
  }
  const message = `${distances}: upwelling or sinking at the shore and alongshore pressure rule here; use model coastal.`;
  return { ...note, severity: "doNotUse", message, threshold: COASTAL };
};
