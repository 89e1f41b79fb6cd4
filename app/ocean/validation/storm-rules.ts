import { LONGEST_GAP } from "../constants";
import type { ScenarioProblem, ScenarioStorm } from "../scenario";
import { secondsOf } from "../time-stamps";

/** Times that were added up may miss the limit by rounding, s. */
const ROUNDING = 1e-3;

/** What must hold between the storm's series: one length, times in order, no gap too long to bridge. */
export function stormRules(storm: ScenarioStorm): ScenarioProblem[] {
  return [...lengthProblems(storm), ...timeProblems(storm)];
}

function lengthProblems(storm: ScenarioStorm): ScenarioProblem[] {
  const series: [string, number[] | undefined][] = [
    ["storm.windSpeed", storm.windSpeed],
    ["storm.windFrom", storm.windFrom],
    ["storm.rain", storm.rain],
    ["storm.evaporation", storm.evaporation],
    ...Object.entries(storm.heat ?? {}).map(([name, values]): [string, number[] | undefined] => [
      `storm.heat.${name}`,
      values,
    ]),
  ];
  const problems: ScenarioProblem[] = [];
  for (const [path, values] of series) {
    if (values === undefined || values.length === storm.time.length) continue;
    const message = `Holds ${values.length} values for ${storm.time.length} times; give one value for each time.`;
    problems.push({ path, code: "INVALID_INPUT", message });
  }
  if (
    storm.heat?.net &&
    Object.keys(storm.heat).some((name) => name !== "net" && storm.heat?.[name as keyof typeof storm.heat])
  ) {
    const message = "Give either the net heat flux or its components, not both.";
    problems.push({ path: "storm.heat", code: "INVALID_INPUT", message });
  }
  return problems;
}

function timeProblems({ time }: ScenarioStorm): ScenarioProblem[] {
  const problems: ScenarioProblem[] = [];
  let before: number | null = null;
  for (let k = 0; k < time.length; k++) {
    const path = `storm.time[${k}]`;
    const seconds = secondsOf(time[k]);
    if (typeof time[k] !== typeof time[0]) {
      problems.push({ path, code: "INVALID_INPUT", message: "Times must be all ISO 8601 text or all seconds." });
      return problems;
    }
    if (seconds === null) {
      const message = `"${String(time[k])}" is not an ISO 8601 time with its zone; write 2026-11-04T20:00:00Z.`;
      problems.push({ path, code: "INVALID_INPUT", message });
      continue;
    }
    if (before !== null && seconds <= before) {
      const message = `${String(time[k])} is not later than the time before it; sort the times and drop repeats.`;
      problems.push({ path, code: "INVALID_INPUT", message });
    }
    if (before !== null && seconds - before > LONGEST_GAP + ROUNDING) {
      const hours = ((seconds - before) / 3600).toFixed(1);
      const message = `A gap of ${hours} h before ${String(time[k])}; gaps longer than ${LONGEST_GAP / 3600} h are not bridged. Fill it or shorten the storm.`;
      problems.push({ path, code: "GAP", message });
    }
    before = seconds;
  }
  return problems;
}
