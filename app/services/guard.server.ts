/**
 * Guards run as middleware: a layout's loader is passed over by `.data` requests for a child, by resource routes and
 * by a child's action; its middleware is not.
 */
import { data, redirect, type MiddlewareFunction } from "react-router";
import { actorContext, organisationContext } from "~/context";
import { forOrganisation } from "~/db/scoped.server";
import { findUser, membershipBySlug } from "~/db/unscoped.server";
import { may, type Action } from "~/organisations/permissions";
import { signedInUserId } from "./session.server";
import type { RouterContextProvider } from "react-router";

type Middleware = MiddlewareFunction<Response>;

/** Puts whoever is signed in, or nobody, into the context. */
export const findActor: Middleware = async ({ request, context }) => {
  const userId = await signedInUserId(request);
  const user = userId === null ? null : await findUser(userId);
  context.set(actorContext, user && { id: user.id, name: user.name, email: user.email });
};

/** Only for people who are signed in; others are sent to sign in and come back. */
export const requireActor: Middleware = ({ request, context }) => {
  if (context.get(actorContext)) return;
  const { pathname, search } = new URL(request.url);
  const back = request.method === "GET" ? `?to=${encodeURIComponent(pathname.replace(/\.data$/, "") + search)}` : "";
  throw redirect(`/sign-in${back}`);
};

export function notFound(): never {
  throw data("There is nothing here.", { status: 404 });
}

/** Only for members of the organisation that the address names. To anyone else it does not exist. */
export const requireMembership: Middleware = async ({ params, context }) => {
  const actor = context.get(actorContext);
  const found = actor && (await membershipBySlug(actor.id, params.organisation ?? ""));
  if (!found) notFound();
  const { id, slug, name, units, paperSize } = found.organisation;
  context.set(organisationContext, { id, slug, name, units, paperSize, ...found.standing });
};

/**
 * A cross-site request carries no session (SameSite) and is refused here as well, by what the browser says of its origin.
 * Browsers send at least one of the two headers with every request that can change something.
 */
export const refuseCrossSite: Middleware = ({ request }) => {
  if (request.method === "GET" || request.method === "HEAD") return;
  const site = request.headers.get("Sec-Fetch-Site");
  const origin = request.headers.get("Origin");
  const sameSite = site === null || site === "same-origin" || site === "none";
  const sameOrigin = origin === null || (URL.canParse(origin) && new URL(origin).host === new URL(request.url).host);
  if (!sameSite || !sameOrigin || (site === null && origin === null)) {
    throw data("This form was sent from another site.", { status: 403 });
  }
};

/** The current organisation and the way to its rows, where the actor may do this; 403 where the role does not allow it. */
export function allowed(context: Readonly<RouterContextProvider>, action: Action) {
  const organisation = context.get(organisationContext);
  const actor = context.get(actorContext);
  if (!actor || !may(organisation, action)) {
    throw data("Your role in this organisation does not allow this.", { status: 403 });
  }
  return { actor, organisation, tenant: forOrganisation(organisation.id) };
}
