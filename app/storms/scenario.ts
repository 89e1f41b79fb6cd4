import { formatNumber, SPACE } from "~/units/format-quantity";
import type { ChannelName, ReadingStep } from "~/readers/reading";
import type { ChannelSeries } from "./channel-series";
import { CHANNELS } from "./channels";
import { CONSTANT_KINDS, constantLabel } from "./constant-kinds";
import type { ConstantForcing, RecordProvenance } from "./provenance";

/** What a copied storm changes against the one it was copied from: 1, 1 and 0 change nothing. */
export interface ScenarioChanges {
  /** On mean wind and gusts. */
  windFactor: number;
  /** On rain. */
  rainFactor: number;
  /** Later is positive. */
  shiftHours: number;
}

/** Carried by every record of a scenario. */
export interface StormScenario extends ScenarioChanges {
  /** Name of the storm that was copied, as it was then. */
  of: string;
}

const HOUR = 3600;

/** As `wind × 1.2, rain × 2, 6 h later`; `unchanged` where nothing is. */
export function scenarioWords({ windFactor, rainFactor, shiftHours }: ScenarioChanges): string {
  const hours = `${plain(Math.abs(shiftHours))}${SPACE}h`;
  const words = [
    windFactor !== 1 && `wind × ${plain(windFactor)}`,
    rainFactor !== 1 && `rain × ${plain(rainFactor)}`,
    shiftHours !== 0 && `${hours} ${shiftHours > 0 ? "later" : "earlier"}`,
  ].filter((word) => word !== false);
  return words.length === 0 ? "unchanged" : words.join(", ");
}

/** What the values of a channel are multiplied by; directions, heat, air and sea stay as they were. */
export function factorOf(channel: ChannelName, { windFactor, rainFactor }: ScenarioChanges): number {
  if (channel === "windSpeed" || channel === "windGust") return windFactor;
  return channel === "rain" ? rainFactor : 1;
}

export function changeSeries(series: ChannelSeries, changes: ScenarioChanges): ChannelSeries {
  const factor = factorOf(series.channel, changes);
  return {
    ...series,
    time: series.time.map((seconds) => seconds + changes.shiftHours * HOUR),
    values: factor === 1 ? series.values : series.values.map((value) => value * factor),
  };
}

/** A record's name and provenance in a scenario: what was changed is one more step, so that it reaches the memo. */
export function changeRecord(
  record: { name: string; provenance: RecordProvenance },
  scenario: StormScenario,
): { name: string; provenance: RecordProvenance } {
  const { provenance } = record;
  const later = (iso: string) => new Date(Date.parse(iso) + scenario.shiftHours * HOUR * 1000).toISOString();
  const constant = provenance.constant && changeConstant(provenance.constant, scenario);
  return {
    name: constant ? constantName(constant, record.name) : record.name,
    provenance: {
      ...provenance,
      first: later(provenance.first),
      last: later(provenance.last),
      steps: [...provenance.steps, ...stepsOf(provenance, scenario)],
      ...(constant && { constant }),
      scenario,
    },
  };
}

function changeConstant({ channel, value, asWritten }: ConstantForcing, changes: ScenarioChanges): ConstantForcing {
  const factor = factorOf(channel, changes);
  return { channel, value: value * factor, asWritten: { ...asWritten, value: asWritten.value * factor } };
}

function constantName({ channel, asWritten }: ConstantForcing, name: string): string {
  const kind = CONSTANT_KINDS.find((candidate) => candidate.channel === channel && candidate.unit === asWritten.unit);
  return kind ? constantLabel(kind, asWritten.value) : name;
}

function stepsOf({ channels, rows }: RecordProvenance, scenario: StormScenario): ReadingStep[] {
  const scaled = channels.flatMap(({ channel, count }): ReadingStep[] => {
    const factor = factorOf(channel, scenario);
    return factor === 1
      ? []
      : [
          {
            id: "scenario-factor",
            label: `${CHANNELS[channel].label} × ${plain(factor)} for the scenario`,
            channel,
            count,
          },
        ];
  });
  const { shiftHours } = scenario;
  if (shiftHours === 0) return scaled;
  const label = `${plain(Math.abs(shiftHours))}${SPACE}h ${shiftHours > 0 ? "later" : "earlier"} for the scenario`;
  return [...scaled, { id: "scenario-shift", label, channel: "time", count: rows }];
}

/** As few decimals as tell it, three at most. */
function plain(value: number): string {
  const decimals = [0, 1, 2].find((count) => Number(value.toFixed(count)) === value) ?? 3;
  return formatNumber(value, decimals);
}
