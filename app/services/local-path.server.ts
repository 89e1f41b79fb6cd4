/** A path on this site that someone may be sent on to, or null: never another site, however it is written. */
export function localPath(path: string | undefined): string | null {
  if (!path || !/^\/(?![/\\])/.test(path) || /[\\\u0000-\u001f]/.test(path)) return null;
  const url = new URL(path, "http://local.invalid");
  return url.origin === "http://local.invalid" ? url.pathname + url.search : null;
}
