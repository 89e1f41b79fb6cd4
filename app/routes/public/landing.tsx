import { Link, redirect } from "react-router";
import type { Route } from "./+types/landing";
import { Mark } from "~/components/mark";
import { actorContext } from "~/context";
import { CAUTION } from "~/ocean/caution";

export function loader({ context }: Route.LoaderArgs) {
  if (context.get(actorContext)) throw redirect("/o");
  return null;
}

const STEPS = [
  ["Area", "Draw study boxes on the map, or type their corners. Area, f and the inertial period stand beside them."],
  [
    "Storms",
    "Bring the buoy's or the gauge's own file. A reading sheet says what was understood and asks where it is unsure.",
  ],
  [
    "Water",
    "Describe the layer and what lies below it. A column that would overturn is refused before anything is run.",
  ],
  ["Estimates", "Drift and transport, freshening, warming or cooling, density; and where the method does not apply."],
  ["Memos", "Text, figures and numbers that point at estimates, checked, issued as a revision, shared by a link."],
] as const;

export default function Landing() {
  return (
    <main className="mx-auto max-w-4xl px-5 py-14 sm:py-24">
      <title>Galeprint: what the storm leaves in the water</title>
      <meta
        name="description"
        content="Screening estimates of the surface layer under a storm, from raw records to a checked memo."
      />
      <Mark size={64} />
      <h1 className="mt-6 text-title font-bold sm:text-[2.75rem] sm:leading-tight">
        What the storm leaves in the water.
      </h1>
      <p className="mt-4 max-w-prose text-large text-slate">
        For coastal consultancies: from a wind record, a rain gauge and one cast to a memo that a checker can retrace
        number by number.
      </p>
      <p className="mt-8 flex flex-wrap gap-3">
        <Link to="/sign-up" className="button button-primary">
          Make an account
        </Link>
        <Link to="/sign-in" className="button">
          Sign in
        </Link>
      </p>
      <dl className="mt-14 border-t-2 border-ink">
        {STEPS.map(([name, text]) => (
          <div key={name} className="grid gap-x-6 border-b border-hairline py-3 sm:grid-cols-[8rem_1fr]">
            <dt className="font-bold">{name}</dt>
            <dd className="text-slate">{text}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-8 text-slate">
        The <Link to="/methods">methods</Link> are published ones, each with its source. Someone sent you a memo?{" "}
        <Link to="/verify">Verify it by its stamp</Link>
      </p>
      <p className="mt-10 max-w-prose text-small text-quiet">{CAUTION}</p>
    </main>
  );
}
