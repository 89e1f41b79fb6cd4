import { joinUnit, MINUS } from "~/units/format-quantity";

/** `1.18 × 10⁻⁴ 1/s`, always in 10⁻⁴, so that boxes compare at a glance. @param f Coriolis parameter, 1/s */
export function formatCoriolis(f: number): string {
  const size = Math.abs(f * 1e4).toFixed(3);
  return joinUnit(`${f < 0 ? MINUS : ""}${size} × 10⁻⁴`, "1/s");
}
