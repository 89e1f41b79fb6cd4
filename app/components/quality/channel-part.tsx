import { SeriesFigure } from "~/components/storms/series-figure";
import { WideTable } from "~/components/wide-table";
import type { Figure } from "~/figures/figure";
import type { ChannelQuality, GapLine, TestLine } from "~/quality/present-channel";
import { SectionHeading } from "~/components/section-heading";

interface ChannelPartProps {
  quality: ChannelQuality;
  figure: Figure | null;
  narrow: Figure | null;
}

/** One channel: its plot with the flags, what each test did, and its gaps. */
export function ChannelPart({ quality, figure, narrow }: ChannelPartProps) {
  const { channel, label, tests, gaps, gapRule } = quality;
  return (
    <section aria-labelledby={channel}>
      <SectionHeading id={channel}>{label[0].toUpperCase() + label.slice(1)}</SectionHeading>
      {figure ? (
        <SeriesFigure figure={figure} narrow={narrow} />
      ) : (
        <p className="text-slate">Nothing of it lies in the window.</p>
      )}
      <div className="mt-3 grid gap-x-10 gap-y-4 lg:grid-cols-2">
        <TestTable label={label} tests={tests} />
        <div className="min-w-0">
          <p className="text-small text-slate">{gapRule}</p>
          {gaps.length === 0 ? <p className="mt-1">No gap in the window.</p> : <GapTable label={label} gaps={gaps} />}
        </div>
      </div>
    </section>
  );
}

function TestTable({ label, tests }: { label: string; tests: readonly TestLine[] }) {
  if (tests.length === 0) return <p className="text-slate">No test is made of it.</p>;
  return (
    <WideTable label={`Tests of ${label}`}>
      <thead>
        <tr>
          <th scope="col">Test</th>
          {["Good", "Suspect", "Bad", "Not evaluated"].map((head) => (
            <th key={head} scope="col" className="number">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {tests.map(({ test, rule, good, suspect, bad, notEvaluated }) => (
          <tr key={test}>
            <td>
              {test}
              <span className="block min-w-40 text-small text-slate">{rule}</span>
            </td>
            {[good, suspect, bad, notEvaluated].map((count, index) => (
              <td key={index} className="number">
                {count}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </WideTable>
  );
}

const MOST_GAPS = 20;

function GapTable({ label, gaps }: { label: string; gaps: readonly GapLine[] }) {
  return (
    <>
      <WideTable label={`Gaps of ${label}`}>
        <thead>
          <tr>
            <th scope="col">Gap</th>
            <th scope="col" className="number">
              Length (h)
            </th>
            <th scope="col" className="number">
              Samples missing
            </th>
            <th scope="col">Effect</th>
          </tr>
        </thead>
        <tbody>
          {gaps.slice(0, MOST_GAPS).map(({ period, hours, missing, effect }) => (
            <tr key={period}>
              <td>{period}</td>
              <td className="number">{hours.toFixed(1)}</td>
              <td className="number">{missing}</td>
              <td>{effect}</td>
            </tr>
          ))}
        </tbody>
      </WideTable>
      {gaps.length > MOST_GAPS && <p className="text-small text-slate">and {gaps.length - MOST_GAPS} more</p>}
    </>
  );
}
