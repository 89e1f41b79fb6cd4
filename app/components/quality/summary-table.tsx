import { WideTable } from "~/components/wide-table";
import { FLAGS, SHORT_FLAG_WORDS } from "~/quality/flags";
import type { ChannelQuality } from "~/quality/present-channel";
import { FlagSymbol } from "./flag-symbol";

const VERDICTS: Record<ChannelQuality["verdict"], string> = {
  fits: "",
  caution: "told with the estimate",
  refused: "above the limit",
  notUsed: "not used by estimates",
};

/** Counts per channel and flag, and how much an estimate does without. */
export function SummaryTable({ channels }: { channels: readonly ChannelQuality[] }) {
  return (
    <WideTable label="Flags by channel">
      <thead>
        <tr>
          <th scope="col">Channel</th>
          {FLAGS.map((flag) => (
            <th key={flag} scope="col" className="number">
              <FlagSymbol flag={flag} /> {flag} · {SHORT_FLAG_WORDS[flag]}
            </th>
          ))}
          <th scope="col" className="number">
            Set by a person
          </th>
          <th scope="col" className="number">
            Missing or left out
          </th>
        </tr>
      </thead>
      <tbody>
        {channels.map(({ channel, label, counts, overridden, shareMissing, verdict }) => (
          <tr key={channel}>
            <td>
              <a href={`#${channel}`}>{label}</a>
            </td>
            {counts.map(({ flag, count }) => (
              <td key={flag} className="number">
                {count}
              </td>
            ))}
            <td className="number">{overridden}</td>
            <td className={`number ${verdict === "refused" ? "font-bold text-error" : ""}`}>
              {(shareMissing * 100).toFixed(1)} %
              {VERDICTS[verdict] !== "" && <span className="block text-small font-normal">{VERDICTS[verdict]}</span>}
            </td>
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}
