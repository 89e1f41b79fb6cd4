import { sha256 } from "@noble/hashes/sha2.js";
import { bytesToHex } from "@noble/hashes/utils.js";
import { useState } from "react";
import { Field } from "./field";

/** Holds a file against the PDF that was issued, in the browser: the file goes nowhere. */
export function PdfCheck({ expected }: { expected: string }) {
  const [checked, setChecked] = useState<{ name: string; same: boolean } | null>(null);
  const check = async (file: File | undefined) => {
    if (!file) return setChecked(null);
    const hash = bytesToHex(sha256(new Uint8Array(await file.arrayBuffer())));
    setChecked({ name: file.name, same: hash === expected });
  };
  return (
    <div>
      <Field id="pdf" label="Your file" hint="It is compared here in the browser and is not sent anywhere.">
        {(described) => (
          <input
            {...described}
            type="file"
            accept="application/pdf"
            onChange={({ target }) => void check(target.files?.[0])}
            className="block w-full min-w-0 text-base file:mr-3 file:border file:border-ink file:bg-transparent file:px-3 file:py-1.5 file:text-ink"
          />
        )}
      </Field>
      <p role="status" className={checked && !checked.same ? "mt-2 font-bold text-error" : "mt-2 font-bold"}>
        {checked &&
          (checked.same
            ? `${checked.name} is, byte for byte, the PDF that was issued.`
            : `${checked.name} is not the PDF that was issued under this stamp: it is another file, or it was changed. Ask the issuer for the original.`)}
      </p>
    </div>
  );
}
