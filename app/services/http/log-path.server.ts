/** Path segments followed by a secret: share links, invitations and resets of a password. */
const BEFORE_A_TOKEN = new Set(["s", "invitation", "invitations", "invite", "reset", "reset-password", "verify-email"]);
const LONGEST = 500;

/**
 * The path of a request as it may be logged: without the query string, and with tokens masked.
 * @param url the request's target, such as `/s/abc.data?x=1`
 */
export function logPath(url: string): string {
  const path = url.split(/[?#]/, 1)[0];
  const segments = path.split("/");
  const masked = segments.map((segment, index) =>
    segment !== "" && BEFORE_A_TOKEN.has(segments[index - 1]?.toLowerCase() ?? "") ? "***" : segment,
  );
  return masked.join("/").slice(0, LONGEST);
}
