import { data, Form, Link, redirect } from "react-router";
import { z } from "zod";
import type { Route } from "./+types/revision";
import { ConfirmButton } from "~/components/confirm-button";
import { Field } from "~/components/field";
import { PageTitle } from "~/components/page-title";
import { ShareLinkShown } from "~/components/share-link-shown";
import { SubmitButton } from "~/components/submit-button";
import { WideTable } from "~/components/wide-table";
import { currentRevision } from "~/memo/current-revision.server";
import { DocumentView } from "~/memo/document-view";
import { may } from "~/organisations/permissions";
import { currentProject } from "~/projects/current-project.server";
import { notFound } from "~/services/guard.server";
import { readForm } from "~/services/read-form.server";
import { createShareLink, listShareLinks, revokeShareLink } from "~/sharing/share-link.server";
import { formatTime } from "~/units/format-time";

const shareSchema = z.object({
  recipient: z.string("Write who the link is for.").trim().min(1, "Write who the link is for.").max(120),
  days: z
    .number({ error: "Write for how many days the link stays open." })
    .int("Write whole days.")
    .min(1, "A link stays open for at least a day.")
    .max(365, "A link stays open for at most 365 days."),
});

export async function loader({ context, params }: Route.LoaderArgs) {
  const { tenant, organisation, project } = await currentProject(context, params, "project.view");
  const { revision } = await currentRevision(tenant, project, params);
  const mayShare = may(organisation, "memo.share");
  const links = mayShare ? await listShareLinks(tenant, revision.id) : [];
  const { label, document, stamp, pdfSha256, issuedAt, purpose } = revision;
  return {
    revision: { label, stamp, pdfSha256, purpose, issued: formatTime(issuedAt, project.timeZone) },
    document,
    links: links.map((link) => ({
      ...link,
      created: formatTime(link.created, project.timeZone),
      expires: formatTime(link.expires, project.timeZone),
    })),
    mayShare,
    pdf: `/o/${organisation.slug}/projects/${project.id}/memos/${revision.memoId}/revisions/${revision.id}/memo.pdf`,
  };
}

export async function action({ request, context, params }: Route.ActionArgs) {
  const { tenant, project, actor } = await currentProject(context, params, "memo.share");
  const { revision } = await currentRevision(tenant, project, params);
  const form = await request.clone().formData();
  if (form.get("intent") === "revoke") {
    if (!(await revokeShareLink(tenant, revision.id, String(form.get("link") ?? "")))) notFound();
    return redirect(request.url);
  }
  const submission = await readForm(request, shareSchema);
  if (submission.status !== "success") {
    return data({ address: null, errors: submission.error ?? {} }, { status: 400 });
  }
  const address = await createShareLink(tenant, {
    ...submission.value,
    memoRevisionId: revision.id,
    createdBy: actor.id,
  });
  return data({ address, errors: {} as Record<string, string[] | null> });
}

export default function Revision({ actionData, loaderData }: Route.ComponentProps) {
  const { revision, document, links, mayShare, pdf } = loaderData;
  const errors: Record<string, string[] | null> = actionData?.errors ?? {};
  return (
    <>
      <PageTitle
        actions={
          <a href={pdf} className="button button-primary">
            Download the PDF
          </a>
        }
      >
        Revision {revision.label}, issued for {revision.purpose}
      </PageTitle>
      <p className="text-slate">
        Issued {revision.issued} · stamp {revision.stamp} · read-only
      </p>
      {mayShare && (
        <section aria-labelledby="share" className="mt-6 border-y border-hairline py-4">
          <h3 id="share" className="font-bold">
            Share links
          </h3>
          {actionData?.address && <ShareLinkShown address={actionData.address} />}
          <Form method="post" className="mt-3 flex flex-wrap items-start gap-3">
            <Field id="recipient" label="For" errors={errors.recipient ?? undefined} className="grow sm:max-w-xs">
              {(described) => <input {...described} name="recipient" className="input" autoComplete="off" required />}
            </Field>
            <Field id="days" label="Open for" unit="days" errors={errors.days ?? undefined} className="w-28">
              {(described) => (
                <input {...described} name="days" defaultValue="30" inputMode="numeric" className="input" required />
              )}
            </Field>
            <div className="sm:pt-6">
              <SubmitButton busy="Making…" name="intent" value="share">
                Make a link
              </SubmitButton>
            </div>
          </Form>
          {links.length === 0 ? (
            <p className="mt-3 text-slate">
              No link yet. A link opens this revision and nothing else, without an account.
            </p>
          ) : (
            <div className="mt-4">
              <WideTable label="Share links of this revision">
                <thead>
                  <tr>
                    <th scope="col">For</th>
                    <th scope="col">Made</th>
                    <th scope="col">Open until</th>
                    <th scope="col">State</th>
                    <th scope="col" className="number">
                      Opened
                    </th>
                    <th scope="col" className="number">
                      Downloaded
                    </th>
                    <th scope="col">
                      <span className="sr-only">Act</span>
                    </th>
                  </tr>
                </thead>
                <tbody>
                  {links.map((link) => (
                    <tr key={link.id}>
                      <td>{link.recipient}</td>
                      <td className="whitespace-nowrap">{link.created}</td>
                      <td className="whitespace-nowrap">{link.expires}</td>
                      <td>{link.state}</td>
                      <td className="number">{link.opened}</td>
                      <td className="number">{link.downloaded}</td>
                      <td className="text-right">
                        {link.state === "open" && (
                          <ConfirmButton
                            label="Revoke"
                            title={`Revoke the link for ${link.recipient}?`}
                            fields={{ intent: "revoke", link: link.id }}
                          >
                            It stops at once, also where it is open now. This cannot be taken back.
                          </ConfirmButton>
                        )}
                      </td>
                    </tr>
                  ))}
                </tbody>
              </WideTable>
            </div>
          )}
        </section>
      )}
      <DocumentView document={document} titleLevel={2} />
      <p className="mt-6 break-all text-small text-quiet">SHA-256 of the PDF: {revision.pdfSha256}</p>
      <p className="mt-3">
        <Link to="../.." relative="path">
          The memo
        </Link>
      </p>
    </>
  );
}
