import { ConfirmButton } from "~/components/confirm-button";
import { SectionHeading } from "~/components/section-heading";

export interface ShownAct {
  key: string;
  by: string;
  at: string;
  reason: string;
  /** The flag that was set, in words. */
  what: string;
  /** False where it took others back. */
  setsFlag: boolean;
  channels: string;
  from: string;
  to: string;
  samples: number;
  standing: number;
}

const counted = (count: number) => (count === 1 ? "1 sample" : `${count} samples`);

function standingWords({ samples, standing }: ShownAct): string {
  if (standing === samples) return "stands";
  return standing === 0 ? "no longer stands" : `stands on ${standing} of them`;
}

/** Every act that set or took back flags, newest first; none is ever deleted. */
export function OverrideList({ acts, mayEdit }: { acts: readonly ShownAct[]; mayEdit: boolean }) {
  return (
    <>
      <SectionHeading id="set">Flags set by persons</SectionHeading>
      {acts.length === 0 && <p className="text-slate">None: every flag is that of the tests.</p>}
      <ul>
        {acts.map((act) => (
          <li
            key={act.key}
            className="flex flex-wrap items-start justify-between gap-x-5 gap-y-2 border-b border-hairline py-2.5"
          >
            <div className="min-w-0 grow basis-72">
              <p className="break-words">
                <strong>{act.what}</strong>: {act.reason}
              </p>
              <p className="text-small text-slate">
                {counted(act.samples)} of {act.channels}, {act.samples === 1 ? act.from : `${act.from} to ${act.to}`} ·
                by {act.by}, {act.at}
                {act.setsFlag && ` · ${standingWords(act)}`}
              </p>
            </div>
            {mayEdit && act.standing > 0 && (
              <ConfirmButton
                label="Take back"
                title="Give these samples back to the tests?"
                fields={{ intent: "take-back", act: act.key }}
              >
                {counted(act.standing)} of {act.channels} get the flag of the tests again. What was set stays on this
                list.
              </ConfirmButton>
            )}
          </li>
        ))}
      </ul>
    </>
  );
}
