import { Form, Link } from "react-router";
import { SubmitButton } from "~/components/submit-button";
import type { EstimateState } from "~/estimates/estimate-state";

interface StateBannerProps {
  state: EstimateState;
  sentence: string;
  /** Whether a response of an earlier run stands below. */
  hasResponse: boolean;
  mayRun: boolean;
  home: string;
}

/** Says at the top what the numbers below are worth; nothing where they are current. */
export function StateBanner({ state, sentence, hasResponse, mayRun, home }: StateBannerProps) {
  if (state.kind === "current") return null;
  const underWay = state.kind === "queued" || state.kind === "running";
  return (
    <div
      role={underWay ? "status" : undefined}
      className={`mt-4 flex flex-wrap items-center gap-x-5 gap-y-3 border-2 p-4 ${state.kind === "failed" ? "border-error" : "border-ink"}`}
    >
      <div className="min-w-0 grow basis-80">
        <p className="font-bold">{sentence.charAt(0).toUpperCase() + sentence.slice(1)}.</p>
        {underWay && (
          <p className="text-slate">
            {hasResponse
              ? "Until it is done, the response of the earlier run is shown."
              : "The response appears here when it is done; this page looks for it by itself."}
          </p>
        )}
        {state.kind === "outOfDate" && (
          <p className="text-slate">What is shown below belongs to the inputs of the last run.</p>
        )}
        {state.kind === "failed" && (
          <>
            <ul className="mt-1 list-disc pl-5">
              {state.problems.map(({ path, message }) => (
                <li key={path + message}>
                  {message} {path && <span className="text-small text-quiet">({path})</span>}
                </li>
              ))}
            </ul>
            <p className="mt-2 flex flex-wrap gap-x-4 text-small">
              <Link to={`${home}/storms`}>Storms</Link>
              <Link to={`${home}/water`}>Water</Link>
              <Link to={`${home}/area`}>Area</Link>
            </p>
          </>
        )}
      </div>
      {mayRun && !underWay && (
        <Form method="post">
          <SubmitButton busy="Starting…">Run it again</SubmitButton>
        </Form>
      )}
    </div>
  );
}
