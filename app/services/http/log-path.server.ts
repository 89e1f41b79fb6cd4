/** Path segments followed by a secret: share links, invitations and resets of a password. */
const BEFORE_A_TOKEN = new Set(["s", "invitation", "invitations", "invite", "reset", "reset-password", "verify-email"]);
const LONGEST = 500;

/**
 * The path of a request as it may be logged: without the query string, and with tokens masked.
 * @param url the request's target, such as `/s/abc.data?x=1`
 */
export function logPath(url: string): string {
  let previous = "";
  const masked = url
    .split(/[?#]/, 1)[0]
    .split("/")
    .map((segment) => {
      if (segment === "") return segment;
      const isToken = BEFORE_A_TOKEN.has(previous);
      previous = decoded(segment).toLowerCase();
      return isToken ? "***" : segment;
    });
  return masked.join("/").slice(0, LONGEST);
}

/** The router sees through percent signs, so the mask must. */
function decoded(segment: string): string {
  try {
    return decodeURIComponent(segment);
  } catch {
    return segment;
  }
}
