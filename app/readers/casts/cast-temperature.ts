import type { Understood } from "../reading";
import type { CastAnswers, CastQuestion, TemperatureScale } from "./cast-reading";
import { statedTemperatureScale } from "./cast-vocabulary";

/** t68 = 1.00024 t90. Source: Saunders (1990), WOCE Newsletter 10 (from memory). */
const T68_PER_T90 = 1.00024;

/**
 * Temperatures on the scale of 1990, whichever they were written on.
 * @param values °C, one a record @param unitText unit as written, or null
 */
export function onScaleOf1990(
  values: Float64Array,
  name: string,
  unitText: string | null,
  { temperatureScale: answer }: CastAnswers,
): { values: Float64Array; note: Understood; question: CastQuestion } {
  const stated = statedTemperatureScale(name, unitText);
  const scale: TemperatureScale = answer ?? stated ?? "ITS-90";
  return {
    values: scale === "IPTS-68" ? values.map((t68) => t68 / T68_PER_T90) : values,
    note: {
      what: "Temperature scale",
      taken: scale === "IPTS-68" ? "IPTS-68, turned to ITS-90" : scale,
      confidence: answer ? "answered" : stated ? "stated in the file" : "assumed",
    },
    question: {
      key: "temperatureScale",
      needed: false,
      message: stated
        ? "The column's name or unit says it."
        : "The file does not say which; instruments have used ITS-90 since 1990. At 20 °C the two differ by 0.005 °C.",
      options: [
        { value: "ITS-90", label: "ITS-90" },
        { value: "IPTS-68", label: "IPTS-68" },
      ],
      suggestion: stated ?? "ITS-90",
      ...(answer && { answer }),
    },
  };
}
