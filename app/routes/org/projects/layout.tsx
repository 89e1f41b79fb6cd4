import { Link, NavLink, Outlet } from "react-router";
import type { Route } from "./+types/layout";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { projectParts } from "~/projects/project-state.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const { id, name, jobNumber, client, timeZone } = project;
  return {
    project: { id, name, jobNumber, client, timeZone },
    home: `/o/${organisation.slug}/projects/${id}`,
    parts: await projectParts(tenant, id),
    mayEdit: may(organisation, "project.edit"),
  };
}

export default function ProjectLayout({ loaderData }: Route.ComponentProps) {
  const { project, home, parts, mayEdit } = loaderData;
  return (
    <>
      <title>{`${project.name} · Galeprint`}</title>
      <h1 className="text-title font-bold">
        <Link to={home} className="no-underline hover:underline">
          {project.name}
        </Link>
      </h1>
      <p className="mt-1 text-slate">
        Job {project.jobNumber} · for {project.client} · times in {project.timeZone}
        {mayEdit && (
          <>
            {" · "}
            <Link to={`${home}/facts`}>change</Link>
          </>
        )}
      </p>
      <nav
        aria-label="Parts of the project"
        className="mt-4 grid grid-cols-2 border-y border-hairline sm:grid-cols-3 lg:grid-cols-5"
      >
        {parts.map(({ part, name, state }) => (
          <NavLink
            key={part}
            to={`${home}/${part}`}
            className="-mt-px block border-t-4 border-t-transparent px-3.5 pb-3 pt-2 no-underline hover:bg-mist aria-[current=page]:border-t-ink lg:not-first:border-l lg:border-l-hairline"
          >
            <span className="block font-bold">{name}</span>
            <span className="block text-small text-slate">{state}</span>
          </NavLink>
        ))}
      </nav>
      <Outlet />
    </>
  );
}
