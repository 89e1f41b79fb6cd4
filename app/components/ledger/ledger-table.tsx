import { Link } from "react-router";
import { SmallMarkView } from "~/components/small-mark-view";
import type { LedgerView } from "~/estimates/present-ledger";
import { LedgerCell } from "./ledger-cell";
import { RunButton } from "./run-button";

interface LedgerTableProps {
  ledger: LedgerView;
  home: string;
  mayRun: boolean;
}

const ROW_HEAD =
  "sticky left-0 z-10 w-[8rem] min-w-[8rem] border-r border-hairline bg-paper p-3 text-left align-top sm:w-[14.5rem] sm:min-w-[14.5rem]";

/** Boxes by storms. Wider than the page, it scrolls inside its own box while the boxes' names stay in sight. */
export function LedgerTable({ ledger, home, mayRun }: LedgerTableProps) {
  const { boxes, storms, cells } = ledger;
  return (
    <div role="region" aria-label="Ledger" tabIndex={0} className="relative overflow-x-auto border-t-2 border-ink">
      <table className="h-px w-full border-separate border-spacing-0 border-l border-hairline">
        <caption className="sr-only">Estimates by study box and storm</caption>
        <thead>
          <tr>
            <td className={`${ROW_HEAD} border-b`} />
            {storms.map((storm) => (
              <th
                key={storm.id}
                scope="col"
                className="min-w-[12rem] border-b border-r border-hairline p-3 text-left align-top font-normal"
              >
                <Link to={`${home}/storms/${storm.id}`} className="font-bold no-underline hover:underline">
                  {storm.name}
                </Link>
                {storm.facts.map((fact) => (
                  <span key={fact} className="block text-small text-slate">
                    {fact}
                  </span>
                ))}
                <span className="mt-1 flex flex-wrap items-end justify-between gap-x-3">
                  {storm.spark ? <SmallMarkView mark={storm.spark} /> : <span />}
                  {mayRun && boxes.length > 1 && (
                    <RunButton run={`storm:${storm.id}`} name={`in ${storm.name}`}>
                      Run column
                    </RunButton>
                  )}
                </span>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {boxes.map((box) => (
            <tr key={box.id} className="h-full">
              <th scope="row" className={`${ROW_HEAD} border-b font-normal`}>
                <Link to={`${home}/area/${box.id}`} className="font-bold no-underline hover:underline">
                  {box.name}
                </Link>
                {box.facts.map((fact) => (
                  <span key={fact} className="block text-small text-slate">
                    {fact}
                  </span>
                ))}
                {mayRun && storms.length > 1 && (
                  <RunButton run={`box:${box.id}`} name={`for ${box.name}`}>
                    Run row
                  </RunButton>
                )}
              </th>
              {storms.map((storm) => {
                const cell = cells.find(({ boxId, stormId }) => boxId === box.id && stormId === storm.id);
                const name = `${box.name} in ${storm.name}`;
                return (
                  <td key={storm.id} className="h-full border-b border-r border-hairline p-0 align-top">
                    {cell ? (
                      <LedgerCell cell={cell} showMade={ledger.several} home={home} mayRun={mayRun} name={name} />
                    ) : (
                      <p className="flex items-baseline justify-between gap-3 p-3 text-small text-slate">
                        not run
                        {mayRun && (
                          <RunButton run={`cell:${box.id}:${storm.id}`} name={name}>
                            Run
                          </RunButton>
                        )}
                      </p>
                    )}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
