import { Link, redirect } from "react-router";
import type { Route } from "./+types/choose";
import { AccountPage } from "~/components/account-page";
import { actorContext } from "~/context";
import { organisationsOfUser } from "~/db/unscoped.server";
import { requireActor } from "~/services/guard.server";

export const middleware: Route.MiddlewareFunction[] = [requireActor];

/** Straight on where there is only one organisation. */
export async function loader({ context }: Route.LoaderArgs) {
  const actor = context.get(actorContext);
  const mine = actor ? await organisationsOfUser(actor.id) : [];
  if (mine.length === 1) throw redirect(`/o/${mine[0].organisation.slug}`);
  return { organisations: mine.map(({ organisation: { slug, name }, role }) => ({ slug, name, role })) };
}

export default function ChooseOrganisation({ loaderData }: Route.ComponentProps) {
  return (
    <AccountPage title="Your organisations">
      {loaderData.organisations.length === 0 && <p>You belong to no organisation. Ask an owner or admin to invite you.</p>}
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
