import type { ColourToken } from "~/units/quantities";

/** Text in the colour of its quantity. Written out, since classes are collected from the source. */
export const COLOUR_CLASS: Record<ColourToken, string> = {
  ink: "text-ink",
  wind: "text-wind",
  rain: "text-rain",
  heat: "text-heat",
  density: "text-density",
  drift: "text-drift",
  shore: "text-shore",
};
