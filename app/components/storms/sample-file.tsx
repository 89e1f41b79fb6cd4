import { SAMPLE_BUOY_FILE } from "~/storms/sample-file";

/** For people who want to see the way of the data before they have any. */
export function SampleFile() {
  return (
    <p className="mt-6 text-small text-quiet">
      Nothing at hand?{" "}
      <a href={SAMPLE_BUOY_FILE} download className="text-slate underline">
        Download a sample file
      </a>
      : an invented buoy, an invented storm, in an agency's archive format.
    </p>
  );
}
