import { EQUATORIAL_LIMIT, EQUATORIAL_MARGIN } from "../guards";
import { atLeast, CONVENTION, type Indicator } from "./fit-context";

/** Near the equator f goes to zero, and with it every balance that divides by it. */
export const equatorial: Indicator = ({ place, method }) => {
  const value = Math.abs(place.latitude);
  const steady = method.model === "budget" && method.ekman === "deep";
  const judged = atLeast(value, EQUATORIAL_MARGIN, EQUATORIAL_LIMIT);
  const severity = judged === "doNotUse" && !steady ? "caution" : judged;
  const distance = `The box lies ${value.toFixed(1)}° from the equator`;
  const message =
    severity === "ok"
      ? `${distance}: the Earth's rotation is strong enough for every balance used.`
      : `${distance}: within ${EQUATORIAL_MARGIN}° drift turns slowly and directions are less certain; within ${EQUATORIAL_LIMIT}° there is no steady Ekman drift.`;
  return {
    code: severity === "ok" ? "LATITUDE" : "EQUATORIAL_MARGINAL",
    severity,
    message,
    value,
    threshold: EQUATORIAL_MARGIN,
    source: CONVENTION,
  };
};
