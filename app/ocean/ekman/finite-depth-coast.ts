import {
  add,
  complex,
  conjugate,
  decayed,
  divide,
  exponential,
  modulus,
  multiply,
  scale,
  subtract,
  type Complex,
} from "../complex";
import { requireFinite } from "../guards";
import { power } from "../power";
import {
  ekmanWavenumber,
  finiteDepthBedStress,
  finiteDepthCurrent,
  finiteDepthLayerMean,
  finiteDepthTransport,
  requireSetting,
  WEAK_ROTATION,
  type FiniteDepthSetting,
} from "./finite-depth";

export interface CoastalBalance {
  /** Current at a depth, m/s. */
  currentAt: (z: number) => Complex;
  /** Mean current from the surface to a depth within the water, m/s. */
  layerMean: (layerDepth: number) => Complex;
  /** Rise of the sea surface towards the shore, m/m: positive for set-up. */
  setupSlope: number;
  /** Transport towards the shore, m²/s: zero but for rounding. */
  crossTransport: number;
  /** Transport along the shore, m²/s: positive to the left when looking onshore. */
  alongTransport: number;
  /** What bed and shore hold against the wind, per ρ: bed stress less the push of the tilted surface on the whole depth, m²/s². */
  resistance: Complex;
}

/**
 * Steady current beside a straight shore: wind and the pressure of a tilted surface that lets nothing through the shore.
 * Valid for steady, alongshore-uniform, unstratified water; nothing limits the alongshore current but the bed.
 * @param T kinematic stress τ/ρ, m²/s² @param onshoreTo direction of the shore from the sea, degrees true @param gravity m/s²
 * @throws OceanError NONPOSITIVE_DEPTH, INVALID_INPUT
 * @see Welander (1957), Tellus 9:45-52; Csanady (1982), Circulation in the Coastal Ocean
 */
export function coastalBalance(
  T: Complex,
  setting: FiniteDepthSetting,
  onshoreTo: number,
  gravity: number,
): CoastalBalance {
  requireSetting(setting);
  requireFinite({ onshoreTo, gravity });
  const azimuth = (onshoreTo * Math.PI) / 180;
  const onshore = complex(Math.sin(azimuth), Math.cos(azimuth));
  const pressure = pressureResponse(setting);
  const windTransport = finiteDepthTransport(T, setting);
  const acceleration = -multiply(conjugate(onshore), windTransport).re / pressure.transport.re;
  const push = scale(onshore, acceleration);
  const transport = multiply(conjugate(onshore), add(windTransport, multiply(push, pressure.transport)));
  return {
    currentAt: (z) => add(finiteDepthCurrent(T, setting, z), multiply(push, pressure.currentAt(z))),
    layerMean: (layerDepth) =>
      add(finiteDepthLayerMean(T, setting, layerDepth), multiply(push, pressure.layerMean(layerDepth))),
    setupSlope: -acceleration / gravity,
    crossTransport: transport.re,
    alongTransport: transport.im,
    resistance: add(
      finiteDepthBedStress(T, setting),
      multiply(push, subtract(pressure.bedStress, complex(setting.depth))),
    ),
  };
}

/**
 * Of a unit pressure acceleration: current (1 - cosh λz/cosh λH)/(if), its mean over a layer D
 * (1 - sinh(λD)/(λD cosh λH))/(if), transport (H - tanh(λH)/λ)/(if), bed stress tanh(λH)/λ.
 */
function pressureResponse(setting: FiniteDepthSetting) {
  const { f, depth, eddyViscosity } = setting;
  const lambda = ekmanWavenumber(setting);
  if (modulus(lambda) * depth < WEAK_ROTATION) {
    const lambdaH2 = multiply(scale(lambda, depth), scale(lambda, depth));
    const shape = subtract(complex(1), scale(lambdaH2, 2 / 5));
    return {
      // To the same term as the transport, so that what the bed takes and what is turned add up.
      bedStress: scale(subtract(complex(1), scale(multiply(lambdaH2, shape), 1 / 3)), depth),
      transport: scale(shape, power(depth, 3) / (3 * eddyViscosity)),
      currentAt: (z: number) => complex((depth * depth - z * z) / (2 * eddyViscosity)),
      layerMean: (layerDepth: number) => complex((depth * depth - (layerDepth * layerDepth) / 3) / (2 * eddyViscosity)),
    };
  }
  const rotation = complex(0, f);
  const decay2H = exponential(scale(lambda, -2 * depth));
  const tanh = divide(subtract(complex(1), decay2H), add(complex(1), decay2H));
  return {
    bedStress: divide(tanh, lambda),
    transport: divide(subtract(complex(depth), divide(tanh, lambda)), rotation),
    currentAt: (z: number) => {
      const below = exponential(scale(lambda, -(depth + z)));
      const above = exponential(scale(lambda, -(depth - z)));
      return divide(subtract(complex(1), divide(add(below, above), add(complex(1), decay2H))), rotation);
    },
    layerMean: (layerDepth: number) => {
      const sinh = multiply(exponential(scale(lambda, layerDepth - depth)), decayed(scale(lambda, 2 * layerDepth)));
      const lost = divide(sinh, multiply(scale(lambda, layerDepth), add(complex(1), decay2H)));
      return divide(subtract(complex(1), lost), rotation);
    },
  };
}
