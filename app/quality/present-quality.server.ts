/** All that the quality page shows of a storm. */
import type { Storm } from "~/db/models/storm.server";
import { namesOfUsers } from "~/db/unscoped.server";
import { flaggedSeries } from "~/figures/flagged-series";
import { FIGURE_WIDTHS, type FigureContext } from "~/figures/figure-context";
import { CHANNELS } from "~/storms/channels";
import type { StormWindow } from "~/storms/storm-window";
import { formatTime } from "~/units/format-time";
import type { ReadFilter } from "./flag-filter";
import { findSamples } from "./find-samples";
import { flagMarksOf, insideWindow } from "./flag-marks-of";
import { FLAG_WORDS } from "./flags";
import type { LoadedQuality } from "./load-quality.server";
import { bearableShare } from "./missing-rule";
import { overrideActs, valueNowIn } from "./override-acts";
import { presentChannel } from "./present-channel";
import { LEFT_PERSON, presentFlags, ROWS_PER_PAGE } from "./present-flags";
import { greatestMissing, summariseQuality } from "./summarise-quality";
import { undoneTests } from "./undone-tests";

/** A table of the figure would only repeat the flags table. */
const NO_TABLE = 0;

export function presentChannels(
  { judged, inputs }: LoadedQuality,
  window: StormWindow,
  leaveOutSuspect: boolean,
  context: FigureContext,
) {
  const summaries = summariseQuality(judged, { window, leaveOutSuspect });
  return judged.map((whole, index) => {
    const inside = insideWindow(whole, window);
    const { label, quantity, between } = CHANNELS[whole.channel];
    const draw = (width: number) =>
      inside.time.length === 0
        ? null
        : flaggedSeries(
            {
              id: `quality-${whole.channel}`,
              label,
              quantity,
              between,
              time: inside.time,
              values: inside.values,
              marks: flagMarksOf(inside),
              mostTableRows: NO_TABLE,
            },
            { ...context, width },
          );
    return {
      ...presentChannel(inside, whole, summaries[index], {
        window,
        leaveOutSuspect,
        thresholds: inputs.thresholds,
        zone: context.zone,
      }),
      figure: draw(FIGURE_WIDTHS.wide),
      narrowFigure: draw(FIGURE_WIDTHS.narrow),
    };
  });
}

export async function presentTable(
  { judged, setAt }: LoadedQuality,
  window: StormWindow,
  { filter, page, problems }: ReadFilter,
  { units, zone }: Pick<FigureContext, "units" | "zone">,
) {
  const found = findSamples(judged, filter, window, (place) => setAt(place) !== null);
  const pages = Math.max(1, Math.ceil(found.length / ROWS_PER_PAGE));
  const shown = Math.min(page, pages);
  const places = found.slice((shown - 1) * ROWS_PER_PAGE, shown * ROWS_PER_PAGE);
  const names = await namesOfUsers(places.flatMap((place) => setAt(place)?.createdBy ?? []));
  return {
    rows: presentFlags(places, { units, zone, setAt, names }),
    found: found.length,
    page: shown,
    pages,
    filter,
    problems,
    channels: judged.map(({ channel }) => ({ channel, label: CHANNELS[channel].label })),
  };
}

/** Acts that set or took back flags, newest first. */
export async function presentActs({ inputs, series }: LoadedQuality, zone: string) {
  const acts = overrideActs(inputs.overrides, valueNowIn(series));
  const names = await namesOfUsers(acts.map(({ by }) => by));
  return acts.map(({ key, by, at, reason, flag, channels, from, to, overrides, standing }) => ({
    key,
    by: names.get(by) ?? LEFT_PERSON,
    at: formatTime(at, zone),
    reason,
    setsFlag: flag !== null,
    what: flag === null ? "back to the tests" : FLAG_WORDS[flag],
    channels: channels.map((channel) => CHANNELS[channel].label).join(", "),
    from: formatTime(from, zone),
    to: formatTime(to, zone),
    samples: overrides.length,
    standing,
  }));
}

export function presentMissing({ judged }: LoadedQuality, window: StormWindow, storm: Storm, zone: string) {
  const { leaveOutSuspect, missingAccepted } = storm;
  const greatest = greatestMissing(judged, { window, leaveOutSuspect });
  return {
    greatest,
    refused: greatest > bearableShare(missingAccepted),
    accepted: missingAccepted && { ...missingAccepted, at: formatTime(missingAccepted.at, zone) },
  };
}

export function presentRules({ judged, inputs }: LoadedQuality) {
  return {
    undone: undoneTests(judged, inputs.thresholds, inputs.place),
    thresholdsVersion: inputs.thresholdsVersion,
  };
}
