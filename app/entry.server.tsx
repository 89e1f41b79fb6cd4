import { randomBytes } from "node:crypto";
import { PassThrough } from "node:stream";
import { createReadableStreamFromReadable } from "@react-router/node";
import { isbot } from "isbot";
import { renderToPipeableStream } from "react-dom/server";
import { isRouteErrorResponse, ServerRouter, type EntryContext } from "react-router";
import { closeDatabase } from "~/db/connection.server";
import { resumeEstimates } from "~/estimates/run-queue.server";
import { startSending } from "~/mail/outbox.server";
import { config } from "~/services/config.server";
import { log, requestLog } from "~/services/log.server";
import { requestIdOf } from "~/services/request-facts.server";
import { onShutdown } from "~/services/shutdown.server";

onShutdown("database", closeDatabase);
void resumeEstimates().catch((error: unknown) => log().error({ err: error }, "could not resume estimates"));
startSending();

export const streamTimeout = 10_000;

/** Scripts only with this document's nonce; the map needs its own worker and draws to blobs. */
function contentSecurityPolicy(nonce: string): string {
  const development = config().nodeEnv === "development";
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}'`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "worker-src 'self' blob:",
    `connect-src 'self'${development ? " ws:" : ""}`,
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join("; ");
}

export default function handleRequest(
  request: Request,
  responseStatusCode: number,
  responseHeaders: Headers,
  routerContext: EntryContext,
): Promise<Response> {
  const nonce = randomBytes(16).toString("base64");
  responseHeaders.set("Content-Type", "text/html; charset=utf-8");
  responseHeaders.set("Content-Security-Policy", contentSecurityPolicy(nonce));
  if (!responseHeaders.has("Cache-Control")) responseHeaders.set("Cache-Control", "private, no-store");
  if (request.method === "HEAD") {
    return Promise.resolve(new Response(null, { status: responseStatusCode, headers: responseHeaders }));
  }
  const ready = isbot(request.headers.get("user-agent") ?? "") ? "onAllReady" : "onShellReady";
  return new Promise((resolve, reject) => {
    let status = responseStatusCode;
    let shellRendered = false;
    const { pipe, abort } = renderToPipeableStream(
      <ServerRouter context={routerContext} url={request.url} nonce={nonce} />,
      {
        nonce,
        [ready]() {
          shellRendered = true;
          const body = new PassThrough({
            final(callback) {
              clearTimeout(timer);
              callback();
            },
          });
          pipe(body);
          resolve(new Response(createReadableStreamFromReadable(body), { status, headers: responseHeaders }));
        },
        onShellError: reject,
        onError(error: unknown) {
          status = 500;
          // Errors before the shell reach handleError below.
          if (shellRendered) log().error({ err: error }, "rendering failed");
        },
      },
    );
    const timer = setTimeout(abort, streamTimeout + 1000);
  });
}

/** What was thrown and is not an answer: the person sees a plain page with the request's id, the log has the rest. */
export function handleError(error: unknown, { request }: { request: Request }): void {
  if (request.signal.aborted || (isRouteErrorResponse(error) && error.status < 500)) return;
  requestLog(requestIdOf(request)).error({ err: error, path: new URL(request.url).pathname }, "a request failed");
}
