import { Form } from "react-router";
import { SectionHeading } from "~/components/section-heading";
import { SubmitButton } from "~/components/submit-button";

interface SuspectPartProps {
  leaveOutSuspect: boolean;
  suspect: number;
  mayEdit: boolean;
}

/** Whether estimates keep suspect values. */
export function SuspectPart({ leaveOutSuspect, suspect, mayEdit }: SuspectPartProps) {
  return (
    <>
      <SectionHeading id="suspect">Suspect values</SectionHeading>
      <p className="max-w-prose text-slate">
        In a storm, suspect very often means of interest. {suspect === 1 ? "One sample" : `${suspect} samples`} in the
        window {suspect === 1 ? "is" : "are"} flagged so;{" "}
        <strong>estimates {leaveOutSuspect ? "leave them out" : "keep them"}.</strong> What they change stands under the
        inputs of each response.
      </p>
      {mayEdit && (
        <Form method="post" preventScrollReset className="mt-3">
          <input type="hidden" name="leaveOutSuspect" value={leaveOutSuspect ? "no" : "yes"} />
          <SubmitButton busy="Changing…" name="intent" value="suspect" primary={false}>
            {leaveOutSuspect ? "Keep suspect values" : "Leave suspect values out"}
          </SubmitButton>
        </Form>
      )}
    </>
  );
}
