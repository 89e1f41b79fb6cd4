import { data, Form } from "react-router";
import type { Route } from "./+types/verify";
import { AccountPage } from "~/components/account-page";
import { Field } from "~/components/field";
import { PdfCheck } from "~/components/pdf-check";
import { SubmitButton } from "~/components/submit-button";
import { verifyStamp, type StampVerdict } from "~/sharing/verify-stamp.server";

const HEADERS = { "Cache-Control": "private, no-store", "X-Robots-Tag": "noindex" };

export async function loader({ request }: Route.LoaderArgs) {
  const typed = new URL(request.url).searchParams.get("stamp")?.trim() ?? "";
  return data({ typed, verdict: typed === "" ? null : await verifyStamp(typed) }, { headers: HEADERS });
}

export function headers({ loaderHeaders }: Route.HeadersArgs) {
  return loaderHeaders;
}

function problemOf(verdict: StampVerdict | null): string[] | undefined {
  if (verdict?.kind === "misread") return ["This is no stamp. A stamp reads like GP-7K2M-41XQ."];
  if (verdict?.kind === "unknown")
    return [
      `No memo was issued here under ${verdict.stamp}. Check its letters and digits; if they are right, do not rely on the memo.`,
    ];
  return undefined;
}

/** Anyone who holds a memo can find out whether it was issued, and whether it still stands. */
export default function Verify({ loaderData }: Route.ComponentProps) {
  const { typed, verdict } = loaderData;
  return (
    <AccountPage title="Verify a memo">
      <Form method="get" className="grid gap-4">
        <Field
          id="stamp"
          label="Stamp"
          hint="It stands in the title block at the foot of every sheet."
          errors={problemOf(verdict)}
        >
          {(described) => (
            <input
              {...described}
              name="stamp"
              defaultValue={typed}
              required
              autoComplete="off"
              autoCapitalize="characters"
              spellCheck={false}
              className="input"
            />
          )}
        </Field>
        <div>
          <SubmitButton busy="Looking…">Verify</SubmitButton>
        </div>
      </Form>
      {verdict?.kind === "issued" && <Issued verdict={verdict} />}
    </AccountPage>
  );
}

function Issued({ verdict }: { verdict: Extract<StampVerdict, { kind: "issued" }> }) {
  const { stamp, organisation, memoNumber, revision, purpose, issued, supersededBy, pdfSha256 } = verdict;
  const facts = [
    ["Memo", memoNumber],
    ["Revision", revision],
    ["Issued by", organisation],
    ["Issued for", purpose],
    ["Issued on", issued],
  ];
  return (
    <section aria-label="What was issued" className="mt-8 grid gap-6 border-t-2 border-ink pt-4">
      <p role="status" className="font-bold">
        {supersededBy === null
          ? `${stamp} was issued here, and no later revision has been.`
          : `${stamp} was issued here, but revision ${supersededBy} has taken its place. Ask for that one before you rely on it.`}
      </p>
      <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-6 gap-y-1">
        {facts.map(([label, value]) => (
          <div key={label} className="contents">
            <dt className="text-small text-quiet">{label}</dt>
            <dd className="break-words">{value}</dd>
          </div>
        ))}
      </dl>
      <PdfCheck expected={pdfSha256} />
      <p className="break-all text-small text-quiet">SHA-256 of the PDF: {pdfSha256}</p>
    </section>
  );
}
