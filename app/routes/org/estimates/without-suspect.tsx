import { Link } from "react-router";
import type { Route } from "./+types/without-suspect";
import { EmptyState, PageTitle } from "~/components/page-title";
import { WideTable } from "~/components/wide-table";
import { estimateCode } from "~/estimates/estimate-code";
import { presentSuspect } from "~/estimates/present-suspect";
import { withAndWithoutSuspect } from "~/estimates/with-and-without-suspect.server";
import { CAUTION } from "~/ocean/caution";
import { currentProject } from "~/projects/current-project.server";
import { notFound } from "~/services/guard.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const estimate = await tenant.estimates.find(params.estimate, { where: { projectId: project.id } });
  const box = estimate && (await tenant.studyBoxes.find(estimate.studyBoxId));
  const comparison = estimate && (await withAndWithoutSuspect(tenant, estimate, project.timeZone));
  if (!estimate || !box || !comparison) notFound();
  return {
    home: `/o/${organisation.slug}/projects/${project.id}`,
    stormId: estimate.stormId,
    code: estimateCode(project.jobNumber, estimate.number),
    ...presentSuspect(comparison, {
      units: organisation.units,
      zone: project.timeZone,
      shore: box.shoreNormal !== null,
    }),
  };
}

/** What suspect values change: the same estimate with them and without. */
export default function WithoutSuspect({ loaderData }: Route.ComponentProps) {
  const { home, stormId, code, suspect, problems, rows } = loaderData;
  const quality = `${home}/storms/${stormId}/quality`;
  return (
    <>
      <title>{`With and without suspect values · ${code} · Galeprint`}</title>
      <PageTitle>With and without suspect values</PageTitle>
      <p className="text-small text-slate">
        <Link to=".." relative="path">
          Estimate {code}
        </Link>{" "}
        · {suspect} suspect {suspect === 1 ? "value" : "values"} in the window ·{" "}
        <Link to={quality}>quality of the storm</Link>
      </p>
      {suspect === 0 ? (
        <EmptyState title="No value in the window is suspect">
          With and without are the same. Thresholds, and flags that you set, are on the storm&apos;s quality page.
        </EmptyState>
      ) : (
        <>
          {problems.map((problem) => (
            <p key={problem} className="mt-3 max-w-prose border-l-4 border-ink pl-3">
              {problem}
            </p>
          ))}
          {rows.length > 0 && (
            <>
              <p className="my-3 max-w-prose text-slate">
                Both are run on the inputs as they are now, without an ensemble. Where the two differ by more than the
                answer can bear, look the values through.
              </p>
              <WideTable label="Headline figures with and without suspect values">
                <thead>
                  <tr>
                    {["Figure", "Kept", "Left out", "Difference"].map((name, index) => (
                      <th key={name} scope="col" className={index > 0 ? "number" : undefined}>
                        {name}
                      </th>
                    ))}
                  </tr>
                </thead>
                <tbody>
                  {rows.map(({ label, kept, leftOut, difference }) => (
                    <tr key={label}>
                      <td>{label}</td>
                      <td className="number whitespace-nowrap">{kept}</td>
                      <td className="number whitespace-nowrap">{leftOut}</td>
                      <td className="number whitespace-nowrap font-bold">{difference}</td>
                    </tr>
                  ))}
                </tbody>
              </WideTable>
            </>
          )}
        </>
      )}
      <p className="mt-6 max-w-prose text-small text-slate">{CAUTION}</p>
    </>
  );
}
