import { OceanError } from "../errors";
import { requireFinite, requireLatitude, requirePositive } from "../guards";
import { power } from "../power";
import { holland1980, hollandB } from "./holland-1980";
import { holland2008 } from "./holland-2008";
import { holland2010 } from "./holland-2010";
import { cycloneRain } from "./rain-climatology";
import { turnedAndCarried } from "./surface-wind";
import type { CycloneProfileId, TrackParameters } from "./track-parameters";
import { fromCentre, trackReader, type CycloneFix, type CycloneState } from "./track-state";

/** Wind, pressure and rain of a passing cyclone at one place, by time. */
export interface TrackWind {
  /** As asked. */
  time: Float64Array;
  /** m/s at 10 m, 10-minute mean, towards east and north. */
  u: Float64Array;
  v: Float64Array;
  /** Air pressure, hPa. */
  pressure: Float64Array;
  /** mm/h; null where the parameters leave rain out. */
  rain: Float64Array | null;
  /** Distance from the centre, m. */
  distance: Float64Array;
}

/** A vortex at one moment, ready to be asked at any distance. */
interface Vortex {
  /** Surface wind around the centre at a distance (m), m/s. */
  around: (r: number) => number;
  /** Shape of the pressure field. */
  shape: number;
}

interface VortexInput {
  state: CycloneState;
  /** hPa, > 0 */
  deficit: number;
  /** hPa */
  ambient: number;
  /** m */
  radius: number;
  /** The strongest wind around the centre at the surface, m/s; null where the track does not tell. */
  surfaceMaximum: number | null;
}

/** A profile of wind by distance: the place to add another. */
const VORTICES: Record<CycloneProfileId, (input: VortexInput, parameters: TrackParameters) => Vortex> = {
  holland1980({ state, deficit, ambient, radius, surfaceMaximum }, parameters) {
    const { airDensity, reduction } = parameters;
    const gradient = surfaceMaximum === null ? null : surfaceMaximum / reduction;
    const B =
      parameters.B ??
      (gradient === null
        ? shapeByPressure(state, deficit, airDensity).bs
        : hollandB(gradient, deficit * PASCAL_PER_HPA, airDensity));
    const cyclone = {
      centralPressure: (ambient - deficit) * PASCAL_PER_HPA,
      ambientPressure: ambient * PASCAL_PER_HPA,
      radiusOfMaximumWind: radius,
      B,
      latitude: state.latitude,
      airDensity,
    };
    return { around: (r) => reduction * holland1980(cyclone, r).v, shape: B };
  },
  holland2010({ state, deficit, radius, surfaceMaximum }, parameters) {
    const byPressure = shapeByPressure(state, deficit, parameters.airDensity);
    const bs = parameters.B ?? byPressure.bs;
    const profile = { vms: surfaceMaximum ?? byPressure.vms, radiusOfMaximumWind: radius, bs, xn: 0.5, rn: null };
    return { around: (r) => holland2010(profile, r), shape: bs };
  },
};

const PASCAL_PER_HPA = 100;
const KNOT = 1852 / 3600;

/**
 * Wind at 10 m, air pressure and rain at a place while a cyclone of a best track passes.
 * The track's maximum wind is brought to a 10-minute mean and freed of the share that the translation adds at the radius of
 * maximum wind; what is left gives the profile its strength. Where the centre's pressure is not below the ambient one
 * there is no vortex, and no wind.
 * @param place latitude and longitude, degrees
 * @param times as the fixes' times, ascending; beyond the track its ends stand
 * @returns arrays as long as `times`
 * @throws OceanError INVALID_INPUT for a track that tells too little, or a parameter that is none
 * @see Holland (1980), (2008); Holland, Belanger & Fritz (2010); Tuleya, DeMaria & Kuligowski (2007) for rain
 */
export function trackWind(
  fixes: readonly CycloneFix[],
  parameters: TrackParameters,
  place: { latitude: number; longitude: number },
  times: ArrayLike<number>,
): TrackWind {
  requireParameters(fixes, parameters);
  requireLatitude(place.latitude);
  requireFinite({ longitude: place.longitude });
  const read = trackReader(fixes);
  const zeros = () => new Float64Array(times.length);
  const [u, v, pressure, distance] = [zeros(), zeros(), zeros(), zeros()];
  const rain = parameters.rain ? zeros() : null;
  for (let k = 0; k < times.length; k++) {
    const state = read(times[k]);
    const { dx, dy } = fromCentre(state, place);
    const r = Math.hypot(dx, dy);
    const at = momentAt(state, parameters, dx, dy, r);
    distance[k] = r;
    u[k] = at.u;
    v[k] = at.v;
    pressure[k] = at.pressure;
    if (rain) rain[k] = at.maximum > 0 ? cycloneRain(r / 1000, at.maximum / KNOT) : 0;
  }
  return { time: Float64Array.from(times), u, v, pressure, rain, distance };
}

function momentAt(state: CycloneState, parameters: TrackParameters, dx: number, dy: number, r: number) {
  const { averagingFactor, asymmetry, inflowAngle } = parameters;
  const ambient = state.ambientPressure ?? parameters.ambientPressure;
  const radius = state.radiusOfMaximumWind ?? parameters.radiusOfMaximumWind;
  const carriedAtRadius = (asymmetry * state.translationSpeed) / 2;
  const surfaceMaximum = state.maxWind === null ? null : Math.max(0, averagingFactor * state.maxWind - carriedAtRadius);
  const deficit =
    state.centralPressure === null ? deficitByWind(surfaceMaximum ?? 0, parameters) : ambient - state.centralPressure;
  if (!(deficit > 0) || surfaceMaximum === 0)
    return { u: 0, v: 0, pressure: ambient - Math.max(0, deficit), maximum: 0 };
  const vortex = VORTICES[parameters.profile]({ state, deficit, ambient, radius, surfaceMaximum }, parameters);
  const { u, v } = turnedAndCarried(
    vortex.around(r),
    { latitude: state.latitude, radiusOfMaximumWind: radius },
    {
      translationSpeed: state.translationSpeed,
      translationTo: state.translationTo,
      outerInflow: inflowAngle,
      asymmetry,
    },
    dx,
    dy,
  );
  const filled = r === 0 ? 0 : Math.exp(-power(radius / r, vortex.shape));
  const maximum = state.maxWind ?? vortex.around(radius) / averagingFactor;
  return { u, v, pressure: ambient - deficit + deficit * filled, maximum };
}

function shapeByPressure(state: CycloneState, deficit: number, airDensity: number) {
  return holland2008({
    pressureDeficitHpa: deficit,
    deepeningHpaPerHour: state.deepening,
    latitude: state.latitude,
    translationSpeed: state.translationSpeed,
    airDensity,
  });
}

/** hPa, from the cyclostrophic balance of the strongest wind, where only B is known. */
function deficitByWind(surfaceMaximum: number, { B, airDensity, reduction, profile }: TrackParameters): number {
  if (B === null) return 0;
  const balanced = profile === "holland1980" ? surfaceMaximum / reduction : surfaceMaximum;
  return (airDensity * Math.E * balanced * balanced) / B / PASCAL_PER_HPA;
}

function requireParameters(fixes: readonly CycloneFix[], parameters: TrackParameters): void {
  const { B, radiusOfMaximumWind, ambientPressure, averagingFactor, reduction, airDensity } = parameters;
  requirePositive({ radiusOfMaximumWind, ambientPressure, averagingFactor, reduction, airDensity });
  if (B !== null) requirePositive({ B });
  const tells = (name: "maxWind" | "centralPressure") => fixes.some((fix) => fix[name] !== null);
  if (!tells("centralPressure") && !(tells("maxWind") && B !== null)) {
    throw new OceanError(
      "INVALID_INPUT",
      "No fix has a central pressure: write it for one fix at least, or give B and a maximum wind.",
    );
  }
}
