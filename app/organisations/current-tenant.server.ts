import type { RouterContextProvider } from "react-router";
import type { Actor, CurrentOrganisation } from "~/context";
import { forOrganisation, type Tenant } from "~/db/scoped.server";
import type { Action } from "~/organisations/permissions";
import { allowed } from "~/services/guard.server";

export interface CurrentTenant {
  actor: Actor;
  organisation: CurrentOrganisation;
  tenant: Tenant;
}

/** The organisation that the address names with its rows, where the actor may do this; else 403. */
export function currentTenant(context: Readonly<RouterContextProvider>, action: Action): CurrentTenant {
  const { actor, organisation } = allowed(context, action);
  return { actor, organisation, tenant: forOrganisation(organisation.id) };
}
