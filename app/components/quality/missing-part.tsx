import { Form } from "react-router";
import { ConfirmButton } from "~/components/confirm-button";
import { Field } from "~/components/field";
import { SectionHeading } from "~/components/section-heading";
import { SubmitButton } from "~/components/submit-button";
import { MISSING_CAUTION, MISSING_REFUSED, type MissingAccepted } from "~/quality/missing-rule";
import { REASON_LENGTH } from "~/quality/posted-quality";
import type { FormErrorsByField } from "~/storms/refusal";

interface MissingPartProps {
  missing: {
    /** 0 to 1, of the channel that lacks most. */
    greatest: number;
    refused: boolean;
    accepted: MissingAccepted | null;
  };
  errors: FormErrorsByField;
  mayEdit: boolean;
}

const percent = (share: number) => `${(share * 100).toFixed(1)}\u00a0%`;

/** The rule on what may be missing, and a person's word to go beyond it. */
export function MissingPart({ missing: { greatest, refused, accepted }, errors, mayEdit }: MissingPartProps) {
  return (
    <>
      <SectionHeading id="missing">What may be missing</SectionHeading>
      <p className="max-w-prose text-slate">
        Above {percent(MISSING_CAUTION)} missing or left out of a channel, an estimate says so; above{" "}
        {percent(MISSING_REFUSED)} none is made, unless a person takes it on with a reason. The most here is{" "}
        {percent(greatest)}. Pauses that are too long to be bridged stop an estimate all the same.
      </p>
      {accepted && (
        <div className="mt-3 border-l-4 border-ink py-1 pl-3">
          <p>
            Taken on up to {percent(accepted.upTo)} by {accepted.by}, {accepted.at}: {accepted.reason}
          </p>
          {refused && <p className="font-bold text-error">More is missing now: it has to be taken on anew.</p>}
          {mayEdit && (
            <div className="mt-2">
              <ConfirmButton label="Withdraw" title="Withdraw this?" fields={{ intent: "withdraw-missing" }}>
                Estimates of the storm become out of date, and none is made while more is missing than the rule allows.
                Runs that were made keep it in their register of inputs.
              </ConfirmButton>
            </div>
          )}
        </div>
      )}
      {refused && (
        <div className="mt-3 border-l-4 border-error py-1 pl-3">
          <p className="font-bold text-error">No estimate of this storm is made as it is.</p>
          <p className="text-slate">Bring a fuller record, narrow the window, or take it on here.</p>
          {mayEdit && (
            <Form method="post" preventScrollReset className="mt-3 grid max-w-prose gap-3">
              <Field
                id="missing-reason"
                label="Why an estimate is right all the same"
                hint="Kept with your name, and printed with the inputs."
                errors={errors.missingReason}
              >
                {(described) => (
                  <textarea {...described} name="missingReason" rows={2} maxLength={REASON_LENGTH} className="input" />
                )}
              </Field>
              <div>
                <SubmitButton busy="Keeping…" name="intent" value="take-on-missing">
                  Take it on
                </SubmitButton>
              </div>
            </Form>
          )}
        </div>
      )}
    </>
  );
}
