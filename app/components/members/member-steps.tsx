import type { ReactNode } from "react";
import { Form } from "react-router";
import { Field } from "~/components/field";
import { Reveal } from "~/components/reveal";
import { SubmitButton } from "~/components/submit-button";
import type { PresentedMember } from "~/organisations/members/list-members.server";

interface MemberStepsProps {
  member: PresentedMember;
  /** Of which they are the originator. */
  memos: number;
  successors: { value: string; label: string }[];
  isSelf: boolean;
  mayHandOver: boolean;
}

function Step({
  member,
  intent,
  label,
  children,
}: {
  member: PresentedMember;
  intent: string;
  label: string;
  children: ReactNode;
}) {
  return (
    <Form method="post" className="grid gap-3">
      <input type="hidden" name="version" value={member.version} />
      {children}
      <div>
        <SubmitButton busy="Working…" name="intent" value={intent}>
          {label}
        </SubmitButton>
      </div>
    </Form>
  );
}

/** What goes further than a role: suspending, removing, handing over the ownership. */
export function MemberSteps({ member, memos, successors, isSelf, mayHandOver }: MemberStepsProps) {
  const name = member.name;
  return (
    <div className="mt-10 border-b border-hairline">
      {!isSelf && !member.suspended && (
        <Reveal label="Suspend…">
          <Step member={member} intent="suspend" label={`Suspend ${name}`}>
            <p>
              {name} is signed out at once, everywhere, and finds nothing of this organisation until you restore them.
              Role, rights and work stay as they are.
            </p>
          </Step>
        </Reveal>
      )}
      {member.suspended && (
        <Reveal label="Restore…">
          <Step member={member} intent="restore" label={`Restore ${name}`}>
            <p>{name} can sign in to this organisation again, with the role and rights that they had.</p>
          </Step>
        </Reveal>
      )}
      {mayHandOver && !isSelf && !member.suspended && (
        <Reveal label="Hand over the ownership…">
          <Step member={member} intent="hand-over" label={`Make ${name} the owner`}>
            <p>{name} becomes an owner and you become an admin. Only an owner can take this back.</p>
          </Step>
        </Reveal>
      )}
      <Reveal label={isSelf ? "Leave the organisation…" : "Remove from the organisation…"}>
        <Step member={member} intent="remove" label={isSelf ? "Leave" : `Remove ${name}`}>
          <p>
            {isSelf ? "You are" : `${name} is`} signed out at once, everywhere. Projects, estimates, signatures and
            issued memos stay, with the name on them.
          </p>
          {memos > 0 && (
            <Field
              id="successor"
              label={`Who goes on with their ${memos === 1 ? "memo" : `${memos} memos`}`}
              hint="They become its originator. Where they had signed a memo as its checker, that signature is taken off."
            >
              {(described) => (
                <select {...described} name="successor" className="input max-w-80">
                  {successors.map(({ value, label }) => (
                    <option key={value} value={value}>
                      {label}
                    </option>
                  ))}
                </select>
              )}
            </Field>
          )}
        </Step>
      </Reveal>
    </div>
  );
}
