import { Link } from "react-router";
import type { Route } from "./+types/list";
import { presentBox } from "~/area/present-box";
import { StudyAreaMap } from "~/components/map/study-area-map";
import { EmptyState, PageTitle } from "~/components/page-title";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.view");
  const boxes = await tenant.studyBoxes.list({ where: { projectId: project.id }, order: [["createdAt", "ASC"]] });
  return {
    boxes: boxes.map((box) => presentBox(box, organisation.units)),
    units: organisation.units,
    mayEdit: may(organisation, "project.edit"),
  };
}

export default function Area({ loaderData }: Route.ComponentProps) {
  const { boxes, mayEdit, units } = loaderData;
  const draw = mayEdit && (
    <>
      <Link to="import" className="button">
        Import shapes
      </Link>
      <Link to="new" className="button button-primary">
        New study box
      </Link>
    </>
  );
  return (
    <>
      <PageTitle actions={draw}>Area</PageTitle>
      {boxes.length === 0 ? (
        <EmptyState title="No study box yet" action={draw}>
          A study box is the piece of sea that an estimate speaks of: the water in front of an intake, a farm, a port.
          Draw it on the map or type its corners; next come a storm and the water.
        </EmptyState>
      ) : (
        <div className="grid gap-6 lg:grid-cols-[3fr_2fr]">
          <StudyAreaMap boxes={boxes} units={units} />
          <ul className="border-t border-hairline">
            {boxes.map(({ id, name, facts }) => (
              <li key={id} className="border-b border-hairline py-3">
                <h3 className="font-bold">{mayEdit ? <Link to={id}>{name}</Link> : name}</h3>
                <dl className="mt-1 grid grid-cols-2 gap-x-4 gap-y-1 text-small sm:grid-cols-3">
                  {facts.map(({ label, value }) => (
                    <div key={label}>
                      <dt className="text-quiet">{label}</dt>
                      <dd>{value}</dd>
                    </div>
                  ))}
                </dl>
              </li>
            ))}
          </ul>
        </div>
      )}
    </>
  );
}
