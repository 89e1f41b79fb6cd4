import { Form } from "react-router";
import { SubmitButton } from "./submit-button";

interface MemoSignaturesProps {
  hindrances: string[];
  checker: string | null;
  /** Of what is on the page: the signature is refused if the memo changed meanwhile. */
  content: string;
  mayCheck: boolean;
  isOriginator: boolean;
}

/** What stands between the draft and an issued revision, and the check. */
export function MemoSignatures({ hindrances, checker, content, mayCheck, isOriginator }: MemoSignaturesProps) {
  return (
    <section aria-label="Check" className="border-t-2 border-ink pt-3">
      <h3 className="font-bold">Check</h3>
      {hindrances.length > 0 && (
        <ul className="mt-2 list-disc pl-5">
          {hindrances.map((hindrance) => (
            <li key={hindrance}>{hindrance}</li>
          ))}
        </ul>
      )}
      {checker !== null && <p className="mt-2">Checked by {checker}, as it stands here.</p>}
      {checker === null && isOriginator && (
        <p className="mt-2 text-slate">
          The originator cannot check their own memo. Another consultant of the organisation opens this page and signs.
        </p>
      )}
      {checker === null && mayCheck && hindrances.length === 0 && (
        <Form method="post" className="mt-3">
          <input type="hidden" name="content" value={content} />
          <p className="mb-2 text-slate">
            I have retraced the numbers on this page to their equations, inputs and sources. Any change voids this
            signature.
          </p>
          <SubmitButton busy="Signing…" primary={false} name="intent" value="sign">
            Sign as checker
          </SubmitButton>
        </Form>
      )}
    </section>
  );
}
