import { Link } from "react-router";
import type { Route } from "./+types/list";
import { EmptyState, PageTitle } from "~/components/page-title";
import { WideTable } from "~/components/wide-table";
import { may } from "~/organisations/permissions";
import { allowed } from "~/services/guard.server";

const PAGE_SIZE = 50;

export async function loader({ context, request }: Route.LoaderArgs) {
  const { organisation, tenant } = allowed(context, "project.view");
  const page = Math.max(1, Math.trunc(Number(new URL(request.url).searchParams.get("page"))) || 1);
  const [total, projects] = await Promise.all([
    tenant.projects.count(),
    tenant.projects.list({ order: [["updatedAt", "DESC"]], limit: PAGE_SIZE, offset: (page - 1) * PAGE_SIZE }),
  ]);
  return {
    projects: projects.map(({ id, name, jobNumber, client, createdAt }) => ({
      id,
      name,
      jobNumber,
      client,
      created: createdAt.toISOString().slice(0, 10),
    })),
    page,
    pages: Math.max(1, Math.ceil(total / PAGE_SIZE)),
    mayEdit: may(organisation, "project.edit"),
  };
}

export default function ProjectList({ loaderData }: Route.ComponentProps) {
  const { projects, page, pages, mayEdit } = loaderData;
  const begin = mayEdit && (
    <Link to="projects/new" className="button button-primary">
      New project
    </Link>
  );
  return (
    <>
      <title>Projects · Galeprint</title>
      <PageTitle first actions={begin}>
        Projects
      </PageTitle>
      {projects.length === 0 ? (
        <EmptyState title="No project yet" action={begin}>
          A project holds one job for one client: its study boxes, its storms, the water, the estimates and the memos.
        </EmptyState>
      ) : (
        <WideTable label="Projects">
          <thead>
            <tr>
              <th scope="col">Project</th>
              <th scope="col">Job</th>
              <th scope="col">Client</th>
              <th scope="col">Begun (UTC)</th>
            </tr>
          </thead>
          <tbody>
            {projects.map(({ id, name, jobNumber, client, created }) => (
              <tr key={id}>
                <td>
                  <Link to={`projects/${id}`} className="font-bold">
                    {name}
                  </Link>
                </td>
                <td>{jobNumber}</td>
                <td>{client}</td>
                <td className="whitespace-nowrap">{created}</td>
              </tr>
            ))}
          </tbody>
        </WideTable>
      )}
      {pages > 1 && (
        <nav aria-label="Pages" className="mt-4 flex gap-3">
          {page > 1 && <Link to={`?page=${page - 1}`}>Newer</Link>}
          <span className="text-quiet">
            page {page} of {pages}
          </span>
          {page < pages && <Link to={`?page=${page + 1}`}>Older</Link>}
        </nav>
      )}
    </>
  );
}
