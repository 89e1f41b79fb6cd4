import { FigureView } from "~/components/figure-view";
import { WideTable } from "~/components/wide-table";
import type { UncertaintyView } from "~/estimates/present-uncertainty";
import type { ResponseFigures } from "~/estimates/response-figures.server";

interface UncertaintyPartProps {
  view: UncertaintyView;
  tornadoes: ResponseFigures["tornadoes"];
}

/** What each headline figure depends on: the leading input in a sentence, the figure, and the shares of the spread. */
export function UncertaintyPart({ view, tornadoes }: UncertaintyPartProps) {
  return (
    <>
      <p className="max-w-prose text-slate">{view.ensemble}</p>
      {view.failures.map((failure) => (
        <p key={failure} className="max-w-prose border-l-4 border-ink pl-3">
          {failure}
        </p>
      ))}
      {view.tooFew !== null && <p className="max-w-prose text-small text-slate">{view.tooFew}</p>}
      {view.effects.map(({ id, label, sentence, shares, others }, index) => {
        const figure = tornadoes[id];
        return (
          <details key={id} open={index === 0} className="border-b border-hairline">
            <summary className="py-2">
              <span className="font-bold">{label}.</span> <span className="text-slate">{sentence}</span>
            </summary>
            <div className="grid gap-4 pb-4">
              {figure && <FigureView figure={figure.wide} narrow={figure.narrow} />}
              {shares.length > 0 && (
                <WideTable label={`Shares of the spread of ${label.toLowerCase()}`}>
                  <thead>
                    <tr>
                      <th scope="col">Input</th>
                      <th scope="col" className="number">
                        Share of the variance, alone
                      </th>
                    </tr>
                  </thead>
                  <tbody>
                    {shares.map(({ factor, share }) => (
                      <tr key={factor}>
                        <td>{factor}</td>
                        <td className="number">{share}</td>
                      </tr>
                    ))}
                    {others !== "" && (
                      <tr>
                        <td className="text-quiet">each of the others</td>
                        <td className="number text-quiet">{others}</td>
                      </tr>
                    )}
                  </tbody>
                </WideTable>
              )}
            </div>
          </details>
        );
      })}
      <details className="border-b border-hairline">
        <summary className="py-2">What was varied, and how far</summary>
        <WideTable label="What was varied">
          <thead>
            <tr>
              <th scope="col">Input</th>
              <th scope="col">Range</th>
              <th scope="col">Where the range comes from</th>
            </tr>
          </thead>
          <tbody>
            {view.factors.map(({ name, range, basis, failed }) => (
              <tr key={name}>
                <td>{name}</td>
                <td>
                  {range}
                  {failed !== "" && <span className="block text-small font-bold">{failed}</span>}
                </td>
                <td className="text-small text-slate">{basis}</td>
              </tr>
            ))}
          </tbody>
        </WideTable>
      </details>
    </>
  );
}
