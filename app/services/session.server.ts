import { createCookie } from "react-router";
import { hashToken, newToken } from "~/db/id.server";
import { Session } from "~/db/models/session.server";
import { config } from "./config.server";

const MINUTE = 60_000;

/**
 * Holds 256 random bits and nothing else, so there is nothing to sign. The row is keyed by their hash: a copy of the
 * database opens no session.
 */
const cookie = createCookie("__Host-galeprint", { path: "/", httpOnly: true, secure: true, sameSite: "lax" });

function idleLimit(now: Date): Date {
  return new Date(now.getTime() + config().sessionIdleMinutes * MINUTE);
}

function absoluteLimit(createdAt: Date): Date {
  return new Date(createdAt.getTime() + config().sessionAbsoluteHours * 60 * MINUTE);
}

function earlier(a: Date, b: Date): Date {
  return a < b ? a : b;
}

async function idOf(request: Request): Promise<string | null> {
  const token: unknown = await cookie.parse(request.headers.get("Cookie"));
  return typeof token === "string" && token !== "" ? hashToken(token) : null;
}

/** Who is signed in in this browser, or null. A session that has run out is removed. */
export async function signedInUserId(request: Request): Promise<string | null> {
  const id = await idOf(request);
  const session = id === null ? null : await Session.findByPk(id);
  if (!session) return null;
  const now = new Date();
  if (session.expiresAt <= now) {
    await session.destroy();
    return null;
  }
  // Once a minute is often enough to know whether someone is idle, and spares a write a request.
  if (now.getTime() - session.lastSeenAt.getTime() > MINUTE) {
    await session.update({ lastSeenAt: now, expiresAt: earlier(idleLimit(now), absoluteLimit(session.createdAt)) });
  }
  return session.userId;
}

async function removeSession(request: Request): Promise<void> {
  const id = await idOf(request);
  if (id !== null) await Session.destroy({ where: { id } });
}

/**
 * Ends whatever session the browser had and starts another: the identifier never survives a change of who is signed in.
 * @returns the `Set-Cookie` header
 */
export async function startSession(request: Request, userId: string): Promise<string> {
  await removeSession(request);
  const token = newToken();
  const now = new Date();
  const expiresAt = earlier(idleLimit(now), absoluteLimit(now));
  await Session.create({ id: hashToken(token), userId, lastSeenAt: now, expiresAt });
  return cookie.serialize(token);
}

/** @returns the `Set-Cookie` header */
export async function endSession(request: Request): Promise<string> {
  await removeSession(request);
  return cookie.serialize("", { maxAge: 0 });
}
