/** Every physical constant of the engine, with its unit and where it comes from. */

/** Rotation rate of the Earth, 1/s. WGS 84 / IERS conventions (from memory, universally tabulated). */
export const EARTH_ROTATION = 7.292115e-5;

/** Acceleration of gravity where the latitude's own value is not asked for, m/s². Convention of this engine. */
export const GRAVITY = 9.81;

/** Von Kármán's constant. As in the COARE and Large & Yeager algorithms. */
export const VON_KARMAN = 0.4;

/** Reference density of seawater (Boussinesq), kg/m³. Convention of this engine. */
export const REFERENCE_DENSITY = 1025;

/** Specific heat that belongs to Conservative Temperature, J/kg/K. TEOS-10, exact by definition. */
export const HEAT_CAPACITY = 3991.86795711963;

/** Density of air where temperature, pressure and humidity are not given, kg/m³. Convention of this engine. */
export const AIR_DENSITY = 1.22;

/** Standard ocean salinity, g/kg. TEOS-10. */
export const STANDARD_SALINITY = 35.16504;

/** Absolute Salinity per unit of Practical Salinity in Reference-Composition seawater, g/kg. TEOS-10. */
export const SALINITY_PER_PSS = 35.16504 / 35;

/** Stefan–Boltzmann constant, W/m²/K⁴. CODATA (from memory). */
export const STEFAN_BOLTZMANN = 5.670374419e-8;

/** 0 °C in K. */
export const CELSIUS_ZERO = 273.15;

/** Density of fresh water for evaporation and rain, kg/m³. Convention of this engine. */
export const FRESH_WATER_DENSITY = 1000;

/** Pascals in a decibar. Exact. */
export const PASCAL_PER_DBAR = 1e4;

export const SECONDS_PER_HOUR = 3600;
export const SECONDS_PER_DAY = 86400;

/** 1 mm/h of rain in m/s. Exact. */
export const MM_PER_HOUR = 1e-3 / SECONDS_PER_HOUR;

/** Damping of slab currents: an e-folding time of four days, 1/s. Pollard & Millard (1970), supported by a later study's abstract. */
export const DAMPING_RATE = 1 / (4 * SECONDS_PER_DAY);

/** Longest gap between samples that is bridged, s. Convention of this engine. */
export const LONGEST_GAP = 6 * SECONDS_PER_HOUR;

/** Wind speed above which the drag coefficient is held, m/s. After Powell, Vickery & Reinhold (2003): drag levels off above hurricane force. */
export const HIGH_WIND_CAP = 33;

/** Saltier, g/kg, or hotter, °C, than any sea: water that a storm would bring beyond this is refused. Convention of this engine. */
export const SALTIEST = 60;
export const HOTTEST = 50;

/** Thinner than this nothing is computed as a layer, m. Convention of this engine. */
export const THINNEST_LAYER = 1e-3;

/** Range of the COARE 3.5 wind–wave fit: neutral 10 m wind, m/s. Edson et al. (2013). */
export const COARE_CAP = 25;
