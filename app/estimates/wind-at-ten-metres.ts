import { scenarioStorm } from "./build-scenario";
import type { StormForcing } from "./storm-forcing";
import { readForcing } from "~/ocean/forcing/read-forcing";
import type { MethodUsed } from "~/ocean/response";
import { DRAG_LAWS, type DragLawId } from "~/ocean/scenario";
import { dragLaw } from "~/ocean/stress/drag-law";

/** The wind as the engine took it, m/s at 10 m by the neutral profile of the response's drag law. */
export function windAtTenMetres(forcing: StormForcing, method: MethodUsed): number[] {
  const law: DragLawId = DRAG_LAWS.find((id) => id === method.dragLaw?.value) ?? "largeYeager2009";
  const number = (entry: MethodUsed[keyof MethodUsed]) => (typeof entry?.value === "number" ? entry.value : undefined);
  const options = {
    coefficient: number(method.dragCoefficient),
    highWindCap: number(method.highWindCap),
    gravity: number(method.gravity),
  };
  const { windU, windV } = readForcing(scenarioStorm(forcing), dragLaw(law, options), "linear");
  return Array.from(windU, (u, index) => Math.hypot(u, windV[index]));
}
