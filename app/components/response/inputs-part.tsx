import { SectionHeading } from "~/components/section-heading";
import type { InputsView, Row } from "~/estimates/present-inputs";

function Rows({ rows }: { rows: Row[] }) {
  return (
    <dl>
      {rows.map(({ label, value }) => (
        <div key={label} className="grid gap-x-4 border-b border-hairline py-1.5 sm:grid-cols-[12rem_minmax(0,1fr)]">
          <dt className="text-small leading-6 text-quiet">{label}</dt>
          <dd className="min-w-0 break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

interface FileLineProps {
  file: { sourceFileId: string | null; fileName: string | null; sha256: string | null };
  /** Where there is no file. */
  name?: string;
  home: string;
}

function FileLine({ file: { sourceFileId, fileName, sha256 }, name, home }: FileLineProps) {
  return (
    <>
      <p className="break-words font-bold">
        {sourceFileId ? <a href={`${home}/files/${sourceFileId}`}>{fileName}</a> : name}
      </p>
      {sha256 && <p className="break-all text-small text-slate">SHA-256 {sha256}</p>}
    </>
  );
}

interface InputsPartProps {
  inputs: InputsView;
  assumptions: string[];
  home: string;
}

/** Everything that the numbers came from, file by file. */
export function InputsPart({ inputs, assumptions, home }: InputsPartProps) {
  return (
    <div className="grid gap-x-10 lg:grid-cols-2">
      <div className="min-w-0">
        <SectionHeading>Box</SectionHeading>
        <Rows rows={inputs.box} />
        <details className="py-2">
          <summary className="text-small">Corners, {inputs.corners.length} positions in WGS 84</summary>
          <ol className="pl-4 text-small">
            {inputs.corners.map((corner, index) => (
              <li key={index}>{corner}</li>
            ))}
          </ol>
        </details>
        <SectionHeading>Water and method</SectionHeading>
        {inputs.castFile && <FileLine file={inputs.castFile} home={home} />}
        <Rows rows={inputs.water} />
        {assumptions.length > 0 && (
          <>
            <SectionHeading>Assumed</SectionHeading>
            <ul className="list-disc pl-5">
              {assumptions.map((assumption) => (
                <li key={assumption}>{assumption}</li>
              ))}
            </ul>
          </>
        )}
      </div>
      <div className="min-w-0">
        <SectionHeading>Storm</SectionHeading>
        <Rows rows={inputs.storm} />
        {inputs.records.map((record, index) => (
          <div key={index} className="mt-4 border-l-2 border-hairline pl-4">
            <FileLine file={record} name={record.name} home={home} />
            <Rows rows={record.rows} />
          </div>
        ))}
      </div>
    </div>
  );
}
