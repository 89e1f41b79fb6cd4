import type { Server } from "node:http";

/**
 * Stops a server without cutting anyone off: no new connection is accepted, the requests under way are finished, idle
 * connections are closed as they fall idle. What is still open after `milliseconds` is cut.
 * @returns whether everything finished by itself
 */
export function stopGracefully(server: Server, milliseconds: number): Promise<boolean> {
  return new Promise((resolve) => {
    let finished = true;
    const limit = setTimeout(() => {
      finished = false;
      server.closeAllConnections();
    }, milliseconds);
    server.prependListener("request", (_request, response) => {
      response.setHeader("Connection", "close");
    });
    const sweep = setInterval(() => server.closeIdleConnections(), 50);
    server.close(() => {
      clearTimeout(limit);
      clearInterval(sweep);
      resolve(finished);
    });
  });
}
