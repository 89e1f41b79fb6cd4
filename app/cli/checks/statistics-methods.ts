import { bulkRichardson } from "~/ocean/fit/bulk-richardson";
import { rossbyNumber } from "~/ocean/fit/rossby-number";
import { rossbyRadius } from "~/ocean/fit/rossby-radius";
import { stormSpeedNumber } from "~/ocean/fit/storm-speed-number";
import { internalWaveSpeed } from "~/ocean/fit/two-layer-speed";
import { latinHypercube } from "~/ocean/statistics/latin-hypercube";
import { morrisEffects } from "~/ocean/statistics/morris";
import { mulberry32 } from "~/ocean/statistics/mulberry32";
import { quantile } from "~/ocean/statistics/quantile";
import { ishigami, sobolIndices } from "~/ocean/statistics/sobol";
import type { CheckMethods } from "../check-methods";

/** Any will do: the tolerance of the published indices covers the sampling. */
const SENSITIVITY_SEED = 1;

export const statisticsMethods: CheckMethods = {
  "stats.quantile7": (inputs) => ({ q: quantile(inputs.numbers("x"), inputs.number("p")) }),
  "stats.sobolIshigami": (inputs) => {
    const [a, b] = [inputs.number("a"), inputs.number("b")];
    const indices = sobolIndices(
      (x) => ishigami(x, a, b),
      3,
      inputs.number("N"),
      inputs.number("seed", SENSITIVITY_SEED),
    );
    const [S1, S2, S3] = indices.first;
    const [ST1, ST2, ST3] = indices.total;
    return { S1, S2, S3, ST1, ST2, ST3 };
  },
  "stats.mulberry32": (inputs) => {
    const random = mulberry32(inputs.number("seed"));
    return { values: Array.from({ length: inputs.number("count") }, () => random()) };
  },
  "stats.lhs": (inputs) => ({ sample: latinHypercube(inputs.number("n"), inputs.number("d"), inputs.number("seed")) }),
  "stats.morrisLinear": (inputs) => {
    const coefficients = inputs.numbers("coef");
    const linear = (x: readonly number[]) => coefficients.reduce((sum, c, i) => sum + c * x[i], 0);
    const { muStar, sigma } = morrisEffects(linear, coefficients.length, {
      levels: inputs.number("levels"),
      trajectories: inputs.number("trajectories"),
      seed: inputs.number("seed"),
    });
    return { muStar, sigma };
  },
  "regime.rossbyRadius": (inputs) => ({ km: rossbyRadius(inputs.number("c"), inputs.number("lat")) / 1000 }),
  "regime.twoLayerSpeed": (inputs) => ({
    c: internalWaveSpeed(inputs.number("gPrime"), inputs.number("h1"), inputs.number("h2")),
  }),
  "regime.stormSpeedNumber": (inputs) => ({
    S: stormSpeedNumber(inputs.number("vt"), inputs.number("Rm"), inputs.number("lat")),
  }),
  "regime.rossbyNumber": (inputs) => ({
    Ro: rossbyNumber(inputs.number("U"), inputs.number("L"), inputs.number("lat")),
  }),
  "regime.bulkRichardson": (inputs) => ({
    Ri: bulkRichardson(
      inputs.number("dRho"),
      inputs.number("h"),
      inputs.number("dU"),
      inputs.number("rho0", 1025),
      inputs.number("g", 9.81),
    ),
  }),
};
