import { textOf, type NetcdfFile, type NetcdfVariable } from "./netcdf-file";

/** A variable of quality flags that belongs to another, and which of its values mean that the other's are bad. */
export interface QualityFlags {
  variable: NetcdfVariable;
  isBad: (flag: number) => boolean;
  /** The bad values with their meanings, as `4 (fail)`. */
  described: string;
}

const BAD = /(?:^|_)(?:bad|fail|failed|failure|missing|erroneous|error|reject|rejected|invalid|wrong|unusable)/i;
const DOUBTFUL = /probably|possibly|potentially|suspect|correctable|questionable|not_bad|no_/i;

/**
 * Flags of a variable, by its `ancillary_variables`. CF 1.13, section 3.5. A flag counts as bad by the words of its
 * meaning; suspect values are kept, since in a storm they are often the storm.
 */
export function flagsOf(file: NetcdfFile, variable: NetcdfVariable): QualityFlags[] {
  const names = textOf(variable.attributes, "ancillary_variables").split(" ");
  return file.variables
    .filter(({ name, kind }) => names.includes(name) && (kind === "integer" || kind === "real"))
    .flatMap((flag) => {
      const meanings = textOf(flag.attributes, "flag_meanings").split(" ");
      const values = flag.attributes.get("flag_values")?.numbers ?? [];
      const masks = flag.attributes.get("flag_masks")?.numbers ?? [];
      const bad = meanings.flatMap((meaning, index) =>
        BAD.test(meaning) && !DOUBTFUL.test(meaning)
          ? [{ meaning, value: values[index] ?? masks[index] ?? NaN, mask: masks[index] }]
          : [],
      );
      if (bad.length === 0) return [];
      const described = bad.map(({ meaning, value }) => `${value} (${meaning.replaceAll("_", " ")})`).join(", ");
      const isBad = (stored: number) =>
        bad.some(({ value, mask }) => (mask === undefined ? stored === value : (stored & mask) === (value & mask)));
      return [{ variable: flag, isBad, described }];
    });
}
