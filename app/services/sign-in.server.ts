import { RateLimiterMemory } from "rate-limiter-flexible";
import { Authenticator } from "remix-auth";
import { FormStrategy } from "remix-auth-form";
import { findUserByEmail } from "~/db/unscoped.server";
import type { User } from "~/db/models/user.server";
import { passwordMatches } from "./password.server";
import { clientAddressOf } from "./request-facts.server";

/** Why a sign-in was refused, in words for the form. The same for an unknown address and a wrong password. */
export class SignInRefused extends Error {
  override name = "SignInRefused";
}

/**
 * Two counters: one address from one place is slowed soon; one place trying many addresses, later.
 * Neither is by address alone, so that nobody can lock another person out.
 */
const byAddressAndPlace = new RateLimiterMemory({ points: 8, duration: 15 * 60, blockDuration: 15 * 60 });
const byPlace = new RateLimiterMemory({ points: 60, duration: 15 * 60 });

export function normaliseEmail(email: string): string {
  return email.trim().toLowerCase();
}

async function isThrottled(place: string, email: string): Promise<boolean> {
  const [pair, alone] = await Promise.all([byAddressAndPlace.get(`${place} ${email}`), byPlace.get(place)]);
  return (pair !== null && pair.consumedPoints >= 8) || (alone !== null && alone.consumedPoints >= 60);
}

async function countFailure(place: string, email: string): Promise<void> {
  await Promise.allSettled([byAddressAndPlace.consume(`${place} ${email}`), byPlace.consume(place)]);
}

const authenticator = new Authenticator<User>();

authenticator.use(
  new FormStrategy(async ({ form, request }) => {
    const email = normaliseEmail(String(form.get("email") ?? ""));
    const password = String(form.get("password") ?? "");
    const place = clientAddressOf(request);
    if (await isThrottled(place, email)) {
      throw new SignInRefused("Too many attempts. Wait a quarter of an hour, then try again.");
    }
    const user = await findUserByEmail(email);
    if (!(await passwordMatches(user?.passwordHash ?? null, password)) || !user) {
      await countFailure(place, email);
      throw new SignInRefused("This e-mail address and password do not belong together.");
    }
    await byAddressAndPlace.delete(`${place} ${email}`);
    return user;
  }),
  "password",
);

/** @throws SignInRefused with a message for the form */
export async function signInWithPassword(request: Request): Promise<User> {
  return authenticator.authenticate("password", request);
}
