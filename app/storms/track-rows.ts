import { PROFILE_NAMES, TRACK_NUMBERS, type TrackNumber } from "~/ocean/cyclone/track-parameters";
import { formatPeriod } from "~/units/format-time";
import { parameterValues } from "./present-track";
import { trackSentence, type StormTrack } from "./storm-track";

const NUMBERS = Object.keys(TRACK_NUMBERS) as TrackNumber[];

/** A track in the register of inputs: what the wind is, from which fixes, and by which parameters. */
export function trackRows(track: StormTrack): { label: string; value: string }[] {
  const { fixes, source, edited, parameters } = track;
  const values = parameterValues(parameters);
  const numbers = NUMBERS.map((name) => {
    const { label, unit } = TRACK_NUMBERS[name];
    return `${label.toLowerCase()} ${values[name] === "" ? "from the track" : values[name]}${unit === "1" ? "" : `\u00a0${unit}`}`;
  });
  return [
    { label: "Wind", value: trackSentence(track) },
    {
      label: "Track",
      value: [
        `${fixes.length} fixes, ${formatPeriod(fixes[0].time, fixes[fixes.length - 1].time, "UTC")}`,
        source ? `${source.fileName}, ${source.formatLabel}, SHA-256 ${source.sha256}` : "typed",
        ...(edited ? ["changed by hand"] : []),
      ].join("; "),
    },
    { label: "Profile and parameters", value: [PROFILE_NAMES[parameters.profile], ...numbers].join("; ") },
  ];
}
