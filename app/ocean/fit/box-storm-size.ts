import { atMost, kilometres, thresholdSource, type Indicator } from "./fit-context";

const SMALL = 0.5;
const LARGE = 1;

/** Whether one wind record can stand for the whole box under a cyclone. */
export const boxStormSize: Indicator = ({ scenario, place }) => {
  const { cyclone } = scenario.storm;
  if (!cyclone || place.size === null) return null;
  const value = place.size / cyclone.radiusOfMaximumWind;
  const severity = atMost(value, SMALL, LARGE);
  const widths = `The box is ${kilometres(place.size)} wide, ${value.toFixed(2)} times the storm's radius of maximum wind of ${kilometres(cyclone.radiusOfMaximumWind)}`;
  const note = { code: "BOX_STORM_SIZE", severity, value, source: thresholdSource("fit-storm-size") };
  if (severity === "ok") {
    return { ...note, message: `${widths}: one wind holds for all of it.`, threshold: SMALL };
  }
  if (severity === "caution") {
    const message = `${widths}, so the wind differs noticeably across it. Divide the box, or read the response as that of its middle.`;
    return { ...note, message, threshold: SMALL };
  }
  const message = `${widths}, so one wind record cannot stand for all of it. Divide the box.`;
  return { ...note, message, threshold: LARGE };
};
