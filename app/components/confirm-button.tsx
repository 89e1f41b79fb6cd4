import { useId, useRef, type ReactNode } from "react";
import { Form, useNavigation } from "react-router";

interface ConfirmButtonProps {
  /** On the button that opens the question, and on the one that does it. */
  label: string;
  title: string;
  /** What will be gone. */
  children: ReactNode;
  /** Sent with the form. */
  fields: Record<string, string>;
}

/** Asks before something is removed. Without scripts it does nothing, rather than the wrong thing. */
export function ConfirmButton({ label, title, children, fields }: ConfirmButtonProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  const busy = useNavigation().state !== "idle";
  return (
    <>
      <button type="button" className="button" onClick={() => dialog.current?.showModal()}>
        {label}
      </button>
      <dialog
        ref={dialog}
        aria-labelledby={titleId}
        className="m-auto w-[min(32rem,calc(100vw-2rem))] border-2 border-ink bg-paper p-5 text-ink backdrop:bg-ink/40"
      >
        <h2 id={titleId} className="text-large font-bold">
          {title}
        </h2>
        <div className="mt-2 text-slate">{children}</div>
        <Form method="post" className="mt-5 flex flex-wrap gap-2" onSubmit={() => dialog.current?.close()}>
          {Object.entries(fields).map(([name, value]) => (
            <input key={name} type="hidden" name={name} value={value} />
          ))}
          <button type="submit" disabled={busy} className="button button-primary">
            {label}
          </button>
          <button type="button" className="button" onClick={() => dialog.current?.close()}>
            Keep it
          </button>
        </Form>
      </dialog>
    </>
  );
}
