import { EQUATORIAL_LIMIT, EQUATORIAL_MARGIN } from "../guards";
import { thresholdSource, type Indicator } from "./fit-context";

/**
 * Near the equator f goes to zero, and with it every balance that divides by it. The steady balance of deep water is
 * refused there by validation; what is left computes, but turns hardly at all.
 */
export const equatorial: Indicator = ({ place }) => {
  const value = Math.abs(place.latitude);
  const note = { value, source: thresholdSource("fit-equator") };
  if (value >= EQUATORIAL_MARGIN) {
    const message = `The box lies ${value.toFixed(1)}° from the equator, where the Earth's rotation is strong enough for every balance used here.`;
    return { ...note, code: "LATITUDE", severity: "ok", message, threshold: EQUATORIAL_MARGIN };
  }
  if (value >= EQUATORIAL_LIMIT) {
    const message = `The box lies ${value.toFixed(1)}° from the equator, where drift turns slowly and its direction is uncertain. Take directions and net displacement as indications.`;
    return { ...note, code: "EQUATORIAL_MARGINAL", severity: "caution", message, threshold: EQUATORIAL_MARGIN };
  }
  const message = `The box lies ${value.toFixed(1)}° from the equator, where there is no steady Ekman drift and water hardly turns from the wind. Use the speed of the drift, not its direction or its transport.`;
  return { ...note, code: "EQUATORIAL", severity: "caution", message, threshold: EQUATORIAL_LIMIT };
};
