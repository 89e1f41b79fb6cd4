import { createSessionStorage, type Session as CookieSession } from "react-router";
import { hashToken, newToken } from "~/db/id.server";
import { Session } from "~/db/models/session.server";
import { config } from "./config.server";

interface SessionData {
  userId: string;
}
interface SessionFlash {
  notice: string;
}

const MINUTE = 60_000;

function idleLimit(): Date {
  return new Date(Date.now() + config().sessionIdleMinutes * MINUTE);
}

function absoluteLimit(createdAt: Date): Date {
  return new Date(createdAt.getTime() + config().sessionAbsoluteHours * 60 * MINUTE);
}

function earlier(a: Date, b: Date): Date {
  return a < b ? a : b;
}

/**
 * The cookie holds 256 random bits and nothing else; the row is keyed by their hash, so that a copy of the
 * database opens no session.
 */
const storage = createSessionStorage<SessionData, SessionFlash>({
  cookie: {
    name: "__Host-galeprint",
    path: "/",
    httpOnly: true,
    secure: true,
    sameSite: "lax",
  },
  async createData(data) {
    const token = newToken();
    const now = new Date();
    await Session.create({
      id: hashToken(token),
      userId: data.userId ?? null,
      data,
      lastSeenAt: now,
      expiresAt: earlier(idleLimit(), absoluteLimit(now)),
    });
    return token;
  },
  async readData(token) {
    const session = await Session.findByPk(hashToken(token));
    if (!session) return null;
    const now = new Date();
    if (session.expiresAt <= now) {
      await session.destroy();
      return null;
    }
    // Once a minute is often enough to know whether someone is idle, and spares a write a request.
    if (now.getTime() - session.lastSeenAt.getTime() > MINUTE) {
      const expiresAt = earlier(idleLimit(), absoluteLimit(session.createdAt));
      await session.update({ lastSeenAt: now, expiresAt });
    }
    return session.data as SessionData;
  },
  async updateData(token, data) {
    await Session.update({ data, userId: data.userId ?? null }, { where: { id: hashToken(token) } });
  },
  async deleteData(token) {
    await Session.destroy({ where: { id: hashToken(token) } });
  },
});

export type BrowserSession = CookieSession<SessionData, SessionFlash>;

export async function readSession(request: Request): Promise<BrowserSession> {
  return storage.getSession(request.headers.get("Cookie"));
}

/** Ends whatever session the browser had and starts another: the identifier never survives a change of who is signed in. */
export async function startSession(request: Request, userId: string): Promise<string> {
  await storage.destroySession(await readSession(request));
  const session = await storage.getSession();
  session.set("userId", userId);
  return storage.commitSession(session);
}

export async function endSession(request: Request): Promise<string> {
  return storage.destroySession(await readSession(request));
}
