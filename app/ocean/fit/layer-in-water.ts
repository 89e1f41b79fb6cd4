import type { Indicator } from "./fit-context";

/** A layer cannot be deeper than the water. */
export const layerInWater: Indicator = ({ water, place }) => {
  if (water.askedDepth === null || place.waterDepth === null) return null;
  const message = `The layer of ${water.askedDepth} m is deeper than the water, so the whole water depth of ${place.waterDepth} m is taken as the layer, without friction on the bed. Check the two depths.`;
  return {
    code: "LAYER_DEEPER_THAN_WATER",
    severity: "caution",
    message,
    value: water.askedDepth,
    threshold: place.waterDepth,
    source: "convention of this engine",
  };
};
