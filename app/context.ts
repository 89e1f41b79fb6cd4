import { createContext } from "react-router";
import type { Standing } from "~/organisations/permissions";
import type { UnitChoices } from "~/units/unit-choices";
import type { PageSize } from "~/memo/document";

/** The person who is signed in. */
export interface Actor {
  id: string;
  name: string;
  email: string;
}

/** The organisation that the address names, and what the actor is in it. */
export interface CurrentOrganisation extends Standing {
  id: string;
  slug: string;
  name: string;
  units: UnitChoices;
  paperSize: PageSize;
}

export const actorContext = createContext<Actor | null>(null);
export const organisationContext = createContext<CurrentOrganisation>();
