import { useState } from "react";

/** The address of a new link, shown this once. */
export function ShareLinkShown({ address }: { address: string }) {
  const [copied, setCopied] = useState(false);
  return (
    <div role="status" className="mt-3 border-2 border-ink p-3">
      <p className="font-bold">Copy this address now: it is not shown again.</p>
      <div className="mt-2 flex flex-wrap gap-2">
        <input
          readOnly
          aria-label="Address of the share link"
          value={address}
          className="input grow basis-72"
          onFocus={(event) => event.currentTarget.select()}
        />
        <button
          type="button"
          className="button"
          onClick={() => void navigator.clipboard.writeText(address).then(() => setCopied(true))}
        >
          {copied ? "Copied" : "Copy"}
        </button>
      </div>
    </div>
  );
}
