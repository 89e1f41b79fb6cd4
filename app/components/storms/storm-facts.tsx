import type { StormSummary } from "~/storms/storm-summary";
import type { StormWindow } from "~/storms/storm-window";
import { windowCautions } from "~/storms/window-cautions";
import { CHANNELS } from "~/storms/channels";
import { compassLetters } from "~/units/compass";
import { formatBearing, formatQuantity } from "~/units/format-quantity";
import { formatPeriod, formatTime } from "~/units/format-time";
import type { UnitChoices } from "~/units/unit-choices";

interface StormFactsProps {
  window: StormWindow | null;
  extent: StormWindow | null;
  summary: StormSummary | null;
  windHeight: number | null;
  averagingMinutes: number | null;
  zone: string;
  units: UnitChoices;
}

/** What the storm is, in figures. */
export function StormFacts({ window, extent, summary, windHeight, averagingMinutes, zone, units }: StormFactsProps) {
  if (!window || !summary) return null;
  const { peakWind, peakGust, peakWindFrom, rainTotal, meanNetHeat, gaps } = summary;
  const facts: { label: string; value: string; note?: string }[] = [
    {
      label: "Window",
      value: formatPeriod(window.startsAt, window.endsAt, zone),
      note: extent ? `records reach from ${formatPeriod(extent.startsAt, extent.endsAt, zone)}` : undefined,
    },
    {
      label: windHeight === null ? "Peak wind" : `Peak wind at ${formatQuantity(windHeight, "depth", units).text}`,
      value: formatQuantity(peakWind?.value, "windSpeed", units).text,
      note: peakWind
        ? [
            peakWindFrom === null ? null : `from ${formatBearing(peakWindFrom)} ${compassLetters(peakWindFrom)}`,
            formatTime(peakWind.at, zone),
            averagingMinutes === null ? "averaging not known" : `mean over ${averagingMinutes} min`,
          ]
            .filter((part) => part !== null)
            .join(" · ")
        : undefined,
    },
    ...(peakGust
      ? [
          {
            label: "Strongest gust",
            value: formatQuantity(peakGust.value, "windGust", units).text,
            note: formatTime(peakGust.at, zone),
          },
        ]
      : []),
    {
      label: "Rain in the window",
      value: rainTotal === null ? "no rain record" : formatQuantity(rainTotal, "rainTotal", units).text,
      note: rainTotal === null ? "estimates take it as none" : undefined,
    },
    {
      label: "Mean net heat",
      value: meanNetHeat === null ? "no net heat record" : formatQuantity(meanNetHeat, "netHeat", units).text,
      note: meanNetHeat === null ? undefined : "positive into the sea",
    },
  ];
  return (
    <>
      <dl className="grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-5">
        {facts.map(({ label, value, note }) => (
          <div key={label} className="border-t border-hairline pt-1">
            <dt className="text-small text-quiet">{label}</dt>
            <dd className="font-bold">{value}</dd>
            {note && <dd className="text-small text-slate">{note}</dd>}
          </div>
        ))}
      </dl>
      {window &&
        peakWind &&
        windowCautions(window, peakWind.at).map((caution) => (
          <p key={caution} className="mt-4 max-w-prose border-l-4 border-ink py-1 pl-3">
            {caution}
          </p>
        ))}
      {gaps.length > 0 && (
        <div className="mt-4 border-l-4 border-error py-1 pl-3">
          <p className="font-bold text-error">
            {gaps.length === 1 ? "A gap" : `${gaps.length} gaps`} of more than 6 h in the window: an estimate will not
            bridge {gaps.length === 1 ? "it" : "them"}.
          </p>
          <ul className="text-small text-slate">
            {gaps.slice(0, 6).map(({ channel, from, to }) => (
              <li key={`${channel} ${from}`}>
                {CHANNELS[channel].label}: {formatPeriod(from, to, zone)}
              </li>
            ))}
            {gaps.length > 6 && <li>and {gaps.length - 6} more</li>}
          </ul>
          <p className="text-small text-slate">Move the window, or bring a record that fills it.</p>
        </div>
      )}
    </>
  );
}
