import type { ColumnDensity } from "./column-state";

/**
 * Linear equation of state ρ0(1 - α(T - T0) + β(S - S0)): for analytic checks.
 * @param alpha 1/K @param beta 1/(g/kg) @param rho0 kg/m³
 */
export function linearDensity({
  rho0,
  alpha,
  beta,
  T0,
  S0,
}: {
  rho0: number;
  alpha: number;
  beta: number;
  T0: number;
  S0: number;
}): ColumnDensity {
  return (rho, S, T, from, to) => {
    for (let k = from; k < to; k++) rho[k] = rho0 * (1 - alpha * (T[k] - T0) + beta * (S[k] - S0));
  };
}
