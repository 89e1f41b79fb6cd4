import { WideTable } from "~/components/wide-table";
import { CHANNELS } from "~/storms/channels";
import type { PresentedReading } from "~/storms/present-reading";
import { formatQuantity } from "~/units/format-quantity";
import { formatTime } from "~/units/format-time";
import type { UnitChoices } from "~/units/unit-choices";

interface ChannelsReadProps {
  reading: PresentedReading;
  units: UnitChoices;
  zone: string;
}

/** The figures of each channel, so that a wrong unit or sign shows at a glance. */
export function ChannelsRead({ reading, units, zone }: ChannelsReadProps) {
  if (reading.channels.length === 0) return <p>No column gave a channel.</p>;
  return (
    <WideTable label="Channels">
      <thead>
        <tr>
          <th scope="col">Channel</th>
          <th scope="col">From column</th>
          <th scope="col" className="number">
            Values
          </th>
          <th scope="col" className="number">
            Missing
          </th>
          <th scope="col" className="number">
            Lowest
          </th>
          <th scope="col" className="number">
            Mean
          </th>
          <th scope="col" className="number">
            Highest
          </th>
          <th scope="col">Highest at</th>
          <th scope="col" className="number">
            Total
          </th>
        </tr>
      </thead>
      <tbody>
        {reading.channels.map(({ channel, fromColumns, count, missing, min, mean, max, maxAt, total }) => {
          const { label, quantity } = CHANNELS[channel];
          const text = (value: number | null) => (value === null ? "–" : formatQuantity(value, quantity, units).text);
          return (
            <tr key={channel}>
              <td className="min-w-32">{label}</td>
              <td>{fromColumns.join(", ")}</td>
              <td className="number">{count}</td>
              <td className="number">{missing}</td>
              <td className="number whitespace-nowrap">{text(min)}</td>
              <td className="number whitespace-nowrap">{text(mean)}</td>
              <td className="number whitespace-nowrap">{text(max)}</td>
              <td className="whitespace-nowrap">{maxAt ? formatTime(maxAt, zone) : "–"}</td>
              <td className="number whitespace-nowrap">
                {total === undefined ? "–" : formatQuantity(total, "rainTotal", units).text}
              </td>
            </tr>
          );
        })}
      </tbody>
    </WideTable>
  );
}
