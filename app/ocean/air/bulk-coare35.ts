import { requireFinite, requireLatitude, requireNotNegative, requirePositive } from "../guards";
import { latentHeatOfVaporisation } from "../heat/evaporation";
import { rainHeatLoss } from "../heat/rain-heat";
import { power } from "../power";
import { charnock } from "../stress/laws/coare35";
import { saturationVapourPressure, seaSurfaceHumidity } from "./humidity";

export interface Coare35Input {
  /** m/s at `height`, relative to the surface current. */
  windSpeed: number;
  /** °C */
  airTemperature: number;
  /** % */
  relativeHumidity: number;
  /** hPa */
  pressure: number;
  /** Bulk temperature of the sea, °C. */
  seaTemperature: number;
  /** Downward shortwave and longwave radiation, W/m². */
  shortwaveDown: number;
  longwaveDown: number;
  /** Height of wind, temperature and humidity, m. */
  height: number;
  /** degrees */
  latitude: number;
  /** Depth of the atmosphere's boundary layer, m. */
  boundaryLayer?: number;
  /** mm/h */
  rainRateMmPerHour?: number;
  /** Whether the cool skin of the sea is reckoned with. */
  coolSkin?: boolean;
}

export interface Coare35Fluxes {
  /** Friction velocity, m/s. */
  ustar: number;
  /** N/m² */
  tau: number;
  /** Sensible and latent heat, W/m², positive OUT of the sea. */
  sensibleLoss: number;
  latentLoss: number;
  /** Cooling of the skin, °C. */
  coolSkin: number;
  /** Obukhov length, m. */
  obukhovLength: number;
  /** W/m², positive cools the sea. */
  rainHeatLoss: number;
}

/** Constants of the algorithm, in its own values. */
const BETA = 1.2;
const KAPPA = 0.4;
const KELVIN = 273.16;
const GAS = 287.1;
const AIR_HEAT = 1004.67;
const WATER_HEAT = 4000;
const WATER_DENSITY = 1022;
const WATER_VISCOSITY = 1e-6;
const WATER_CONDUCTIVITY = 0.6;
const SALT_EXPANSION = 0.026;
const SIGMA = 5.67e-8;
const EMISSIVITY = 0.97;
const ABSORBED = 0.945;
const LEAST_WIND = 0.1;
/** Written as in the reference code, which rounds 1/3: with exact thirds the fluxes differ by 1e-4. */
const THIRD_3 = 0.333;
const THIRD_4 = 0.3333;

/**
 * Bulk fluxes of momentum, heat and moisture by the COARE 3.5 algorithm with cool skin, gustiness and rain heat.
 * @throws OceanError INVALID_INPUT
 * @see Edson et al. (2013), Journal of Physical Oceanography 43:1589-1610; Fairall et al. (2003) for the rest of the algorithm
 */
export function coare35Fluxes(input: Coare35Input): Coare35Fluxes {
  requireInput(input);
  const {
    airTemperature: ta,
    pressure: p,
    seaTemperature: ts,
    height: z,
    boundaryLayer: zi = 600,
    coolSkin: withSkin = true,
  } = input;
  const u = Math.max(LEAST_WIND, input.windSpeed);
  const kelvin = ta + KELVIN;
  const qs = seaSurfaceHumidity(ts, p);
  const e = (input.relativeHumidity / 100) * saturationVapourPressure(ta, p);
  const q = (0.62197 * e) / (p - 0.378 * e);
  const Lv = latentHeatOfVaporisation(ts);
  const rhoAir = (p * 100) / (GAS * kelvin * (1 + 0.61 * q));
  const viscosity = 1.326e-5 * (1 + 6.542e-3 * ta + 8.301e-6 * ta * ta - 4.84e-9 * power(ta, 3));
  const g = localGravity(input.latitude);

  const expansion = 2.1e-5 * power(Math.max(0, ts + 3.2), 0.79);
  const skinScale =
    (16 * g * WATER_HEAT * power(WATER_DENSITY * WATER_VISCOSITY, 3)) / (WATER_CONDUCTIVITY ** 2 * rhoAir ** 2);
  const wet = (0.622 * Lv * qs) / (GAS * (ts + KELVIN) ** 2);
  const netShortwave = ABSORBED * input.shortwaveDown;
  const netLongwaveLoss = (skin: number) => EMISSIVITY * (SIGMA * power(ts - skin + KELVIN, 4) - input.longwaveDown);

  let skin = withSkin ? 0.3 : 0;
  let longwaveLoss = netLongwaveLoss(0.3);
  const dt = ts - ta - 0.0098 * z;
  const dq = qs - q;
  let gusty = Math.sqrt(u * u + 0.5 * 0.5);
  const wind10 = (gusty * Math.log(10 / 1e-4)) / Math.log(z / 1e-4);
  let ustar = 0.035 * wind10;
  const zo10 = (0.011 * ustar * ustar) / g + (0.11 * viscosity) / ustar;
  const cd10 = (KAPPA / Math.log(10 / zo10)) ** 2;
  const zot10 = 10 / Math.exp(KAPPA / (0.00115 / Math.sqrt(cd10)));
  const cd = (KAPPA / Math.log(z / zo10)) ** 2;
  const ct = KAPPA / Math.log(z / zot10);
  const CC = (KAPPA * ct) / cd;
  const ribCritical = -z / (zi * 0.004 * power(BETA, 3));
  const rib = ((-g * z) / kelvin) * ((dt - skin + 0.61 * kelvin * dq) / gusty ** 2);
  const zetaFirst = rib >= 0 ? CC * rib * (1 + ((27 / 9) * rib) / CC) : (CC * rib) / (1 + rib / ribCritical);
  let L = z / zetaFirst;
  ustar = (gusty * KAPPA) / (Math.log(z / zo10) - psiMomentum40(z / L));
  let tstar = (-(dt - skin) * KAPPA) / (Math.log(z / zot10) - psiHeat(z / L));
  let qstar = (-(dq - wet * skin) * KAPPA) / (Math.log(z / zot10) - psiHeat(z / L));
  let thickness = 0.001;
  let charn = charnock(wind10);

  const iterations = zetaFirst > 50 ? 1 : 10;
  let [gustFactor, sensible, latent, skinHumidity] = [1, 0, 0, 0];
  for (let iteration = 0; iteration < iterations; iteration++) {
    const zet = ((KAPPA * g * z) / kelvin) * ((tstar + 0.61 * kelvin * qstar) / (ustar * ustar));
    L = z / zet;
    const zo = (charn * ustar * ustar) / g + (0.11 * viscosity) / ustar;
    const roughnessNumber = (zo * ustar) / viscosity;
    const zoq = Math.min(1.6e-4, 5.8e-5 / power(roughnessNumber, 0.72));
    ustar = (gusty * KAPPA) / (Math.log(z / zo) - psiMomentum26(zet));
    qstar = (-(dq - wet * skin) * KAPPA) / (Math.log(z / zoq) - psiHeat(zet));
    tstar = (-(dt - skin) * KAPPA) / (Math.log(z / zoq) - psiHeat(zet));
    const buoyancy = (-g / kelvin) * ustar * (tstar + 0.61 * kelvin * qstar);
    const gust = buoyancy > 0 ? BETA * power(buoyancy * zi, THIRD_3) : 0.2;
    gusty = Math.sqrt(u * u + gust * gust);
    gustFactor = gusty / u;
    sensible = -rhoAir * AIR_HEAT * ustar * tstar;
    latent = -rhoAir * Lv * ustar * qstar;
    if (withSkin) {
      const heatOut = longwaveLoss + sensible + latent;
      const absorbed =
        netShortwave * (0.065 + 11 * thickness - (6.6e-5 / thickness) * (1 - Math.exp(-thickness / 8e-4)));
      const cooling = heatOut - absorbed;
      const buoyantCooling = expansion * cooling + (SALT_EXPANSION * latent * WATER_HEAT) / Lv;
      const depthScale = WATER_VISCOSITY / (Math.sqrt(rhoAir / WATER_DENSITY) * ustar);
      if (buoyantCooling > 0) {
        const stirred = power((skinScale * buoyantCooling) / power(ustar, 4), 0.75);
        const xl = 6 / power(1 + stirred, THIRD_3);
        thickness = xl * depthScale;
      } else {
        thickness = Math.min(0.01, 6 * depthScale);
      }
      skin = (cooling * thickness) / WATER_CONDUCTIVITY;
      skinHumidity = wet * skin;
      longwaveLoss = netLongwaveLoss(skin);
    }
    charn = charnock((ustar / KAPPA / gustFactor) * Math.log(10 / zo));
  }
  return {
    ustar,
    tau: (rhoAir * ustar * ustar) / gustFactor,
    sensibleLoss: sensible,
    latentLoss: latent,
    coolSkin: skin,
    obukhovLength: L,
    rainHeatLoss: rainHeatLoss({
      rainRateMmPerHour: input.rainRateMmPerHour ?? 0,
      airTemperature: ta,
      seaTemperature: ts,
      q,
      qsea: qs,
      airDensity: rhoAir,
      coolSkin: skin,
      coolSkinHumidity: skinHumidity,
    }),
  };
}

function requireInput(input: Coare35Input): void {
  const { windSpeed, relativeHumidity, pressure, height, latitude, rainRateMmPerHour = 0, boundaryLayer = 600 } = input;
  const { airTemperature, seaTemperature, shortwaveDown, longwaveDown } = input;
  requireNotNegative({ windSpeed, relativeHumidity, rainRateMmPerHour });
  requirePositive({ pressure, height, boundaryLayer });
  requireFinite({ airTemperature, seaTemperature, shortwaveDown, longwaveDown });
  requireLatitude(latitude);
}

/** Gravity as in the algorithm, m/s². */
function localGravity(latitude: number): number {
  const s2 = Math.sin((latitude * Math.PI) / 180) ** 2;
  return (
    9.7803267715 *
    (1 + 0.0052790414 * s2 + 0.0000232718 * s2 ** 2 + 0.0000001262 * power(s2, 3) + 0.0000000007 * power(s2, 4))
  );
}

const ROOT_3 = Math.sqrt(3);

function convective(x: number): number {
  return 1.5 * Math.log((1 + x + x * x) / 3) - ROOT_3 * Math.atan((1 + 2 * x) / ROOT_3) + (4 * Math.atan(1)) / ROOT_3;
}

function blended(kansas: number, freeConvection: number, zeta: number): number {
  const f = (zeta * zeta) / (1 + zeta * zeta);
  return (1 - f) * kansas + f * freeConvection;
}

/** Stability function of momentum; first-guess constants. */
function psiMomentum40(zeta: number): number {
  if (zeta >= 0) return stableMomentum(zeta, 1);
  const x = power(1 - 18 * zeta, 0.25);
  return blended(kansasMomentum(x), convective(power(1 - 10 * zeta, THIRD_4)), zeta);
}

/** Stability function of momentum. */
function psiMomentum26(zeta: number): number {
  if (zeta >= 0) return stableMomentum(zeta, 0.7);
  const x = power(1 - 15 * zeta, 0.25);
  return blended(kansasMomentum(x), convective(power(1 - 10.15 * zeta, THIRD_4)), zeta);
}

function stableMomentum(zeta: number, a: number): number {
  const decay = Math.exp(-Math.min(50, 0.35 * zeta));
  return -(a * zeta + 0.75 * (zeta - 5 / 0.35) * decay + (0.75 * 5) / 0.35);
}

function kansasMomentum(x: number): number {
  return 2 * Math.log((1 + x) / 2) + Math.log((1 + x * x) / 2) - 2 * Math.atan(x) + 2 * Math.atan(1);
}

/** Stability function of heat and moisture. */
function psiHeat(zeta: number): number {
  if (zeta >= 0) {
    const decay = Math.exp(-Math.min(50, 0.35 * zeta));
    return -(power(1 + 0.6667 * zeta, 1.5) + 0.6667 * (zeta - 14.28) * decay + 8.525);
  }
  const x = Math.sqrt(1 - 15 * zeta);
  return blended(2 * Math.log((1 + x) / 2), convective(power(1 - 34.15 * zeta, THIRD_4)), zeta);
}
