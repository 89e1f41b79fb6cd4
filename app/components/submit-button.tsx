import type { ReactNode } from "react";
import { useNavigation } from "react-router";

interface SubmitButtonProps {
  children: ReactNode;
  /** What the button says while the server works. */
  busy: string;
  primary?: boolean;
  name?: string;
  value?: string;
  disabled?: boolean;
}

/** Disabled while its own form is on the way, so that nothing is sent twice. */
export function SubmitButton({ children, busy, primary = true, name, value, disabled }: SubmitButtonProps) {
  const navigation = useNavigation();
  const sending = navigation.state !== "idle" && navigation.formMethod !== undefined;
  const own = name === undefined || navigation.formData?.get(name) === value;
  return (
    <button
      type="submit"
      name={name}
      value={value}
      disabled={sending || disabled}
      className={`button ${primary ? "button-primary" : ""}`}
    >
      {sending && own ? busy : children}
    </button>
  );
}
