import type { ResponseSeries, TriggerOutcome } from "../response";
import type { ScenarioStorm, TriggerLevel, TriggerQuantity } from "../scenario";
import { secondsOf, stampLike } from "../time-stamps";

/** Hours, when first and for how long a quantity lies beyond each trigger level, linear between samples. */
export function triggerOutcomes(
  storm: ScenarioStorm,
  series: ResponseSeries,
  triggers: readonly TriggerLevel[],
): TriggerOutcome[] {
  const seconds = storm.time.map((stamp) => secondsOf(stamp) ?? 0);
  return triggers.map((trigger) => {
    const sign = trigger.side === "above" ? 1 : -1;
    const excess = quantitySeries(series, trigger.quantity).map((value) => sign * (value - trigger.value));
    const spells = spellsAbove(seconds, excess);
    const hours = spells.map(({ from, to }) => (to - from) / 3600);
    const longestSpell = Math.max(0, ...hours);
    return {
      ...trigger,
      hoursBeyond: hours.reduce((sum, spell) => sum + spell, 0),
      firstAt: spells.length > 0 ? stampLike(storm, spells[0].from) : null,
      longestSpell,
      met: spells.length > 0 && longestSpell >= trigger.hours,
    };
  });
}

function quantitySeries(series: ResponseSeries, quantity: TriggerQuantity): number[] {
  switch (quantity) {
    case "driftSpeed":
      return series.driftEast.map((east, k) => Math.hypot(east, series.driftNorth[k]));
    case "stress":
      return series.stressX.map((x, k) => Math.hypot(x, series.stressY[k]));
    default:
      return series[quantity];
  }
}

interface Spell {
  from: number;
  to: number;
}

/** The spells during which a quantity that runs linearly between samples is greater than zero, s. */
export function spellsAbove(seconds: readonly number[], excess: readonly number[]): Spell[] {
  const spells: Spell[] = [];
  let from: number | null = excess[0] > 0 ? seconds[0] : null;
  for (let k = 0; k + 1 < excess.length; k++) {
    const [a, b] = [excess[k], excess[k + 1]];
    const crossing = () => seconds[k] + ((seconds[k + 1] - seconds[k]) * a) / (a - b);
    if (from === null && b > 0) from = crossing();
    else if (from !== null && b <= 0) {
      spells.push({ from, to: crossing() });
      from = null;
    }
  }
  if (from !== null) spells.push({ from, to: seconds[excess.length - 1] });
  return spells.filter(({ from: start, to }) => to > start);
}
