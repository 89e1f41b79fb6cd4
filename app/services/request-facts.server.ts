import { randomUUID } from "node:crypto";

/**
 * What the HTTP server found out about a request travels to the routes in these headers. The server overwrites whatever
 * a client sent under the same names.
 */
export const REQUEST_ID_HEADER = "x-request-id";
export const CLIENT_ADDRESS_HEADER = "x-galeprint-client-address";

const SANE_ID = /^[A-Za-z0-9][A-Za-z0-9._-]{7,63}$/;

/** The id a proxy gave the request when it is short and plain, else a new one. */
export function chooseRequestId(given: string | undefined): string {
  return given !== undefined && SANE_ID.test(given) ? given : randomUUID();
}

/** The id under which this request is logged; show it with an unexpected error. */
export function requestIdOf(request: Request): string {
  return chooseRequestId(request.headers.get(REQUEST_ID_HEADER) ?? undefined);
}

/** The client's address as the trusted proxies tell it, for rate limits; "unknown" outside the server (development). */
export function clientAddressOf(request: Request): string {
  return request.headers.get(CLIENT_ADDRESS_HEADER) ?? "unknown";
}
