import { thresholdSource, type Indicator } from "./fit-context";

/** A cyclone no faster than this leaves time for water to rise under it, m/s. */
const SLOW = 4;

/** Under a slow cyclone water from beneath rises and is mixed in, which no one-dimensional model follows. */
export const upwellingUnderStorm: Indicator = ({ scenario, internalSpeed }) => {
  const { cyclone } = scenario.storm;
  if (!cyclone) return null;
  const value = cyclone.translationSpeed;
  const pace = `The storm's centre moves at ${value.toFixed(1)} m/s`;
  const note = { code: "UPWELLING", value, source: thresholdSource("fit-upwelling") };
  if (internalSpeed !== null && value <= internalSpeed) {
    const message = `${pace}, no faster than long internal waves (${internalSpeed.toFixed(1)} m/s), so water rises under it all the while and rules the cooling. Use a model with three dimensions for temperature and salinity.`;
    return { ...note, severity: "doNotUse", message, threshold: internalSpeed };
  }
  if (value <= SLOW) {
    const message = `${pace}, ${SLOW} m/s or less, so water rises under it and adds to the mixing, which no model here follows. Expect more cooling than estimated.`;
    return { ...note, severity: "caution", message, threshold: SLOW };
  }
  const message = `${pace}, faster than ${SLOW} m/s: water that rises under it adds little to the mixing.`;
  return { ...note, severity: "ok", message, threshold: SLOW };
};
