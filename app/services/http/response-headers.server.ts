import type { RequestHandler } from "express";

const ONE_YEAR_SECONDS = 31_536_000;

/**
 * Headers that every response carries unless its maker chose otherwise. They are filled in as the head is written, not
 * before: React Router appends its headers, and a header that is there twice means something else.
 * The content security policy is not here, since it needs the nonce of the document that is rendered.
 */
export function defaultHeaders(secure: boolean): RequestHandler {
  const defaults: [string, string][] = [
    ["X-Content-Type-Options", "nosniff"],
    ["X-Frame-Options", "DENY"],
    // Not "no-referrer": with it browsers send "Origin: null" with a form, and the check of the origin would refuse it.
    ["Referrer-Policy", "same-origin"],
    ["Permissions-Policy", "camera=(), geolocation=(), microphone=(), payment=(), usb=()"],
    ["Cross-Origin-Opener-Policy", "same-origin"],
    ["Cross-Origin-Resource-Policy", "same-origin"],
    ["Cache-Control", "no-store"],
  ];
  if (secure) defaults.push(["Strict-Transport-Security", `max-age=${ONE_YEAR_SECONDS}; includeSubDomains`]);
  return (_request, response, next) => {
    const writeHead = response.writeHead;
    response.writeHead = function withDefaults(this: typeof response, ...head: Parameters<typeof writeHead>) {
      for (const [name, value] of defaults) if (!this.hasHeader(name)) this.setHeader(name, value);
      return writeHead.apply(this, head);
    } as typeof writeHead;
    next();
  };
}
