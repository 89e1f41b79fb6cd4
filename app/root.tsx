import "./app.css";
import { Links, Meta, Outlet, Scripts, ScrollRestoration, useNavigation } from "react-router";
import type { Route } from "./+types/root";
import { ErrorPage } from "~/components/error-page";
import { findActor, refuseCrossSite } from "~/services/guard.server";

export const middleware: Route.MiddlewareFunction[] = [refuseCrossSite, findActor];

export const links: Route.LinksFunction = () => [{ rel: "icon", href: "/favicon.svg", type: "image/svg+xml" }];

export function Layout({ children }: { children: React.ReactNode }) {
  return (
    <html lang="en">
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <Meta />
        {/* Styles need no nonce, and the browser could not tell it again when the page comes alive. */}
        <Links nonce="" />
      </head>
      <body>
        {children}
        <ScrollRestoration />
        <Scripts />
      </body>
    </html>
  );
}

export default function Root() {
  const busy = useNavigation().state !== "idle";
  return (
    <div aria-busy={busy}>
      {busy && (
        <p role="status" className="fixed right-4 top-4 z-50 border border-ink bg-paper px-3 py-1 text-small">
          Working…
        </p>
      )}
      <Outlet />
    </div>
  );
}

export function ErrorBoundary({ error }: Route.ErrorBoundaryProps) {
  return <ErrorPage error={error} />;
}
