/** What an organisation reads its numbers in. Inside the product everything is SI. */
export interface UnitChoices {
  speed: "m/s" | "kn";
  rain: "mm/h" | "in/h";
  /** Depths and heights. */
  length: "m" | "ft";
  /** Across the sea: displacement, distance to the shore. */
  distance: "km" | "nm";
  salinity: "g/kg" | "PSS-78";
  temperature: "°C";
}

export const DEFAULT_UNITS: UnitChoices = {
  speed: "m/s",
  rain: "mm/h",
  length: "m",
  distance: "km",
  salinity: "g/kg",
  temperature: "°C",
};

/** What may be chosen for each, in the order a form offers it. */
export const UNIT_OPTIONS: { readonly [Key in keyof UnitChoices]: readonly UnitChoices[Key][] } = {
  speed: ["m/s", "kn"],
  rain: ["mm/h", "in/h"],
  length: ["m", "ft"],
  distance: ["km", "nm"],
  salinity: ["g/kg", "PSS-78"],
  temperature: ["°C"],
};
