import { isRouteErrorResponse } from "react-router";
import { Mark } from "./mark";

function describe(error: unknown): { title: string; text: string } {
  if (!isRouteErrorResponse(error)) {
    return {
      title: "Something failed on our side",
      text: "Nothing that was saved is lost. Try again; if it fails once more, tell us the time and the address of this page.",
    };
  }
  const said = typeof error.data === "string" && error.data !== "" ? error.data : undefined;
  switch (error.status) {
    case 403:
      return { title: "Not allowed", text: said ?? "Your role does not allow this. An owner or admin can change it." };
    case 404:
      return { title: "Not found", text: "There is nothing at this address, or it is not yours to see." };
    case 413:
      return { title: "Too large", text: said ?? "This file is larger than can be taken." };
    default:
      return { title: `The request was refused (${error.status})`, text: said ?? error.statusText };
  }
}

export function ErrorPage({ error, home = "/" }: { error: unknown; home?: string }) {
  const { title, text } = describe(error);
  return (
    <main className="mx-auto max-w-xl px-5 py-20">
      <title>{`${title} · Galeprint`}</title>
      <Mark size={40} />
      <h1 className="mt-6 text-title font-bold">{title}</h1>
      <p className="mt-3 text-slate">{text}</p>
      <p className="mt-6">
        <a className="button" href={home}>
          Back to the start
        </a>
      </p>
    </main>
  );
}
