import { Form, Link, Outlet } from "react-router";
import type { Route } from "./+types/layout";
import { ErrorPage } from "~/components/error-page";
import { Mark } from "~/components/mark";
import { actorContext, organisationContext } from "~/context";
import { myOrganisations } from "~/organisations/my-organisations.server";
import { may } from "~/organisations/permissions";
import { requireActor, requireMembership } from "~/services/guard.server";

export const middleware: Route.MiddlewareFunction[] = [requireActor, requireMembership];

/** Beside the middleware, so that moving between pages asks the server. */
export async function loader({ context }: Route.LoaderArgs) {
  const organisation = context.get(organisationContext);
  const { slug, name, role } = organisation;
  const maySettle = may(organisation, "organisation.manage");
  const actor = context.get(actorContext);
  const several = actor !== null && (await myOrganisations(actor.id)).length > 1;
  return { organisation: { slug, name, role }, maySettle, several, actorName: actor?.name ?? "" };
}

export default function OrganisationLayout({ loaderData }: Route.ComponentProps) {
  const { organisation, actorName, maySettle, several } = loaderData;
  return (
    <>
      <a href="#content" className="sr-only focus:not-sr-only focus:absolute focus:left-2 focus:top-2 focus:bg-paper">
        To the content
      </a>
      <header data-chrome className="border-b border-hairline">
        <div className="mx-auto flex max-w-[88rem] flex-wrap items-center gap-x-5 gap-y-1 px-5 py-2.5 lg:px-7">
          <Link to={`/o/${organisation.slug}`} className="flex items-center gap-2.5 text-large font-bold no-underline">
            <Mark /> galeprint
          </Link>
          <Link to={`/o/${organisation.slug}`} className="text-small text-slate no-underline hover:underline">
            {organisation.name}
          </Link>
          <Link
            to={`/o/${organisation.slug}/method-sheets`}
            className="text-small text-slate no-underline hover:underline"
          >
            Method sheets
          </Link>
          <Link to={`/o/${organisation.slug}/members`} className="text-small text-slate no-underline hover:underline">
            Members
          </Link>
          {maySettle && (
            <Link
              to={`/o/${organisation.slug}/settings`}
              className="text-small text-slate no-underline hover:underline"
            >
              Settings
            </Link>
          )}
          <span className="grow" />
          <span className="text-small text-slate">
            {actorName} · {organisation.role}
            {several && (
              <>
                {" · "}
                <Link to="/o" className="text-slate">
                  switch organisation
                </Link>
              </>
            )}
          </span>
          <Form method="post" action="/sign-out">
            <button type="submit" className="text-small text-slate underline">
              Sign out
            </button>
          </Form>
        </div>
      </header>
      <main id="content" className="mx-auto max-w-[88rem] px-5 pb-16 pt-6 lg:px-7">
        <Outlet />
      </main>
    </>
  );
}

export function ErrorBoundary({ error, params }: Route.ErrorBoundaryProps) {
  return <ErrorPage error={error} home={`/o/${params.organisation}`} />;
}
