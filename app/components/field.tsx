import type { ReactNode } from "react";

/** What a form field shows besides its control: label, unit, hint, and what is wrong with it, all tied to the control. */
interface FieldProps {
  id: string;
  label: string;
  /** Shown after the label: numbers never stand without one. */
  unit?: string;
  hint?: ReactNode;
  errors?: string[];
  optional?: boolean;
  className?: string;
  children: (described: { id: string; "aria-describedby"?: string; "aria-invalid"?: true }) => ReactNode;
}

export function Field({ id, label, unit, hint, errors, optional, className, children }: FieldProps) {
  const hintId = hint ? `${id}-hint` : undefined;
  const errorId = errors?.length ? `${id}-error` : undefined;
  const describedBy = [hintId, errorId].filter(Boolean).join(" ") || undefined;
  return (
    <div className={className}>
      <label htmlFor={id} className="mb-1 block text-small font-bold text-slate">
        {label}
        {unit && <span className="font-normal"> ({unit})</span>}
        {optional && <span className="font-normal text-quiet"> · optional</span>}
      </label>
      {children({ id, "aria-describedby": describedBy, "aria-invalid": errorId ? true : undefined })}
      {errorId && (
        <p id={errorId} className="mt-1 text-small font-bold text-error">
          {errors?.join(" ")}
        </p>
      )}
      {hintId && (
        <p id={hintId} className="mt-1 text-small text-quiet">
          {hint}
        </p>
      )}
    </div>
  );
}

/** What is wrong with a form as a whole, announced when it appears. */
export function FormErrors({ errors, id }: { errors?: string[] | null; id?: string }) {
  if (!errors?.length) return null;
  return (
    <div id={id} role="alert" className="border-l-4 border-error py-1 pl-3 text-error">
      {errors.map((error) => (
        <p key={error}>{error}</p>
      ))}
    </div>
  );
}
