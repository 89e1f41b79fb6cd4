import type { RequestHandler, Response } from "express";

const METHODS = new Set(["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"]);
const HOST_NAME = /^(?:[A-Za-z0-9._-]+|\[[0-9A-Fa-f:.]+\])(?::\d{1,5})?$/;

/**
 * Refuses what no route could answer: a method or host that cannot become a request, a path that is not UTF-8, and a body
 * that is too large or does not tell its length (so that no part of the application has to hold more than it expects).
 */
export function guardRequest(uploadLimitBytes: number): RequestHandler {
  return (request, response, next) => {
    if (!METHODS.has(request.method)) {
      response.setHeader("Allow", [...METHODS].join(", "));
      return refuse(response, 405, "Method not allowed", `This address does not answer to ${request.method}.`);
    }
    if (!HOST_NAME.test(request.get("host") ?? "")) {
      return refuse(response, 400, "Bad request", "The request does not name a valid host.");
    }
    if (!isReadablePath(request.originalUrl)) {
      return refuse(response, 400, "Bad request", "The address is not valid: a % must be followed by a UTF-8 code.");
    }
    if (request.headers["transfer-encoding"] !== undefined) {
      return refuse(response, 411, "Length required", "Send the body with a Content-Length.");
    }
    if (Number(request.headers["content-length"] ?? 0) > uploadLimitBytes) {
      const megabytes = uploadLimitBytes / 1024 / 1024;
      return refuse(
        response,
        413,
        "Too large",
        `The upload is larger than ${megabytes} MB, the most that is accepted at once. Nothing was saved. ` +
          "Split the file, or leave out the columns that are not needed.",
      );
    }
    next();
  };
}

function isReadablePath(url: string): boolean {
  if (!url.startsWith("/")) return false;
  try {
    decodeURIComponent(url.split(/[?#]/, 1)[0]);
    return true;
  } catch {
    return false;
  }
}

/** The connection stays open, so that a browser that is still sending reads the answer and not a broken connection. */
function refuse(response: Response, status: number, title: string, detail: string): void {
  response.status(status);
  if (response.req.path.startsWith("/api/")) {
    response.type("application/problem+json").send(JSON.stringify({ type: "about:blank", title, status, detail }));
    return;
  }
  response.type("text/plain").send(`${detail}\n`);
}
