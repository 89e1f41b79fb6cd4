import { FigureView } from "~/components/figure-view";
import type { Figure } from "~/figures/figure";
import { pageSvg } from "~/figures/present-svg";

interface SeriesFigureProps {
  figure: Figure;
  /** For a telephone. */
  narrow: Figure | null;
  /** Where every sample can be had; absent while a record is not confirmed. */
  csvHref?: string;
}

/** A storm's series. The table beneath is left to the CSV file where it would be too long to send with the page. */
export function SeriesFigure({ figure, narrow, csvHref }: SeriesFigureProps) {
  if (figure.table.rows.length > 0)
    return <FigureView figure={figure} narrow={narrow ?? undefined} csvHref={csvHref} />;
  return (
    <figure className="m-0 min-w-0">
      <Drawing figure={figure} className={narrow ? "hidden sm:block print:block" : ""} />
      {narrow && <Drawing figure={narrow} className="sm:hidden print:hidden" />}
      <figcaption className="mt-1 max-w-prose text-small text-slate">
        {figure.caption}{" "}
        {csvHref && (
          <a href={csvHref} className="underline">
            Every sample as CSV
          </a>
        )}
      </figcaption>
    </figure>
  );
}

function Drawing({ figure, className }: { figure: Figure; className: string }) {
  return <div className={`${className} [&_text]:font-sans`} dangerouslySetInnerHTML={{ __html: pageSvg(figure) }} />;
}
