/** The rows of the flags table. */
import { CHANNELS } from "~/storms/channels";
import { formatQuantity } from "~/units/format-quantity";
import { zoneClock } from "~/units/format-time";
import type { UnitChoices } from "~/units/unit-choices";
import type { SamplePlace } from "./find-samples";
import { asFlag, FAIL, SHORT_FLAG_WORDS, SUSPECT, type Flag } from "./flags";
import { sampleKey } from "./overrides";

export interface FlagRow {
  /** Names the sample in a form. */
  key: string;
  /** On the project's wall clock. */
  time: string;
  channel: string;
  value: string;
  flag: Flag;
  flagWords: string;
  /** `spike: bad; rate of change: suspect` */
  raisedBy: string;
  /** Why and by whom, where a person set it. */
  set: string;
  /** Whether there is a value to judge. */
  present: boolean;
}

interface FlagRowOptions {
  units: UnitChoices;
  zone: string;
  setAt: (place: SamplePlace) => { reason: string; createdBy: string } | null;
  names: ReadonlyMap<string, string>;
}

export const ROWS_PER_PAGE = 25;
export const LEFT_PERSON = "someone who has left";

export function presentFlags(places: readonly SamplePlace[], { units, zone, setAt, names }: FlagRowOptions): FlagRow[] {
  const clock = zoneClock(zone);
  return places.map((place) => {
    const { judged, k } = place;
    const { channel, time, values, inForce, tests } = judged;
    const { label, quantity } = CHANNELS[channel];
    const set = setAt(place);
    const raised = tests.flatMap(({ test, flags }) => {
      const flag = asFlag(flags[k]);
      return flag === SUSPECT || flag === FAIL ? [`${test}: ${SHORT_FLAG_WORDS[flag]}`] : [];
    });
    const flag = asFlag(inForce[k]);
    return {
      key: sampleKey(channel, time[k]),
      time: clock.dateTime(time[k]),
      channel: label,
      value: formatQuantity(values[k], quantity, units, { decimals: 2 }).text,
      flag,
      flagWords: SHORT_FLAG_WORDS[flag],
      raisedBy: raised.join("; "),
      set: set ? `${set.reason} (${names.get(set.createdBy) ?? LEFT_PERSON})` : "",
      present: !Number.isNaN(values[k]),
    };
  });
}
