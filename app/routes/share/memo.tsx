import { data } from "react-router";
import type { Route } from "./+types/memo";
import { Mark } from "~/components/mark";
import { DocumentView } from "~/memo/document-view";
import { openShare, SHARE_HEADERS } from "~/sharing/open-share.server";

export async function loader({ request, params }: Route.LoaderArgs) {
  const { revision, supersededBy } = await openShare(request, params.link, "opened");
  return data(
    {
      document: revision.document,
      label: revision.label,
      purpose: revision.purpose,
      stamp: revision.stamp,
      pdfSha256: revision.pdfSha256,
      supersededBy,
      pdf: `/shared/${params.link}/memo.pdf`,
    },
    { headers: SHARE_HEADERS },
  );
}

export function headers({ loaderHeaders }: Route.HeadersArgs) {
  return loaderHeaders;
}

export default function SharedMemo({ loaderData }: Route.ComponentProps) {
  const { document, label, purpose, stamp, pdfSha256, supersededBy, pdf } = loaderData;
  return (
    <div className="mx-auto max-w-4xl px-4 py-6 sm:px-6">
      <title>{`${document.title} · Galeprint`}</title>
      <meta name="robots" content="noindex, nofollow" />
      <header data-chrome className="flex flex-wrap items-center gap-x-4 gap-y-2 border-b border-hairline pb-3">
        <span className="flex items-center gap-2 font-bold">
          <Mark size={20} /> galeprint
        </span>
        <span className="grow text-small text-slate">
          Revision {label}, issued for {purpose} · stamp {stamp}
        </span>
        <a href={pdf} className="button button-primary">
          Download the PDF
        </a>
      </header>
      <main>
        {supersededBy && (
          <p role="status" className="mt-4 border-l-4 border-wind py-1 pl-3">
            Superseded: revision {supersededBy} of this memo has been issued. Ask for it before you rely on this one.
          </p>
        )}
        <DocumentView document={document} />
        <p className="mt-6 break-all text-small text-quiet">
          SHA-256 of the PDF: {pdfSha256}. <a href={`/verify?stamp=${stamp}`}>Hold a file against it</a>
        </p>
      </main>
    </div>
  );
}
