import { Link, redirect } from "react-router";
import type { Route } from "./+types/choose";
import { AccountPage } from "~/components/account-page";
import { actorContext } from "~/context";
import { myOrganisations } from "~/organisations/my-organisations.server";
import { requireActor } from "~/services/guard.server";

export const middleware: Route.MiddlewareFunction[] = [requireActor];

/** Straight on where there is only one organisation. */
export async function loader({ context }: Route.LoaderArgs) {
  const actor = context.get(actorContext);
  const organisations = actor ? await myOrganisations(actor.id) : [];
  if (organisations.length === 1) throw redirect(`/o/${organisations[0].slug}`);
  return { organisations };
}

export default function ChooseOrganisation({ loaderData }: Route.ComponentProps) {
  return (
    <AccountPage title="Your organisations">
      {loaderData.organisations.length === 0 && (
        <p>You belong to no organisation. Ask an owner or admin to invite you.</p>
      )}
      <ul>
        {loaderData.organisations.map(({ slug, name, role }) => (
          <li key={slug} className="border-b border-hairline py-3">
            <Link to={`/o/${slug}`} className="text-large font-bold">
              {name}
            </Link>
            <p className="text-small text-quiet">you are {role} here</p>
          </li>
        ))}
      </ul>
    </AccountPage>
  );
}
