import { useId } from "react";
import { Field } from "~/components/field";
import {
  CYCLONE_PROFILES,
  DEFAULT_TRACK_PARAMETERS,
  PROFILE_NAMES,
  TRACK_NUMBERS,
  type CycloneProfileId,
  type TrackNumber,
} from "~/ocean/cyclone/track-parameters";
import { parameterValues } from "~/storms/present-track";
import { parameterField } from "~/storms/posted-track";
import type { FormErrorsByField } from "~/storms/refusal";

interface TrackParametersFieldsProps {
  profile: CycloneProfileId;
  values: Record<TrackNumber, string>;
  rain: boolean;
  errors: FormErrorsByField;
}

const NUMBERS: readonly TrackNumber[] = [
  "B",
  "radiusOfMaximumWind",
  "ambientPressure",
  "averagingFactor",
  "reduction",
  "inflowAngle",
  "asymmetry",
  "airDensity",
];

/** How wind is made of a track: each parameter with its unit, default and source. */
export function TrackParametersFields({ profile, values, rain, errors }: TrackParametersFieldsProps) {
  const id = useId();
  const defaults = parameterValues(DEFAULT_TRACK_PARAMETERS);
  return (
    <div className="grid items-start gap-4 sm:grid-cols-2 lg:grid-cols-3">
      <Field
        id={`${id}-profile`}
        label="Profile"
        errors={errors[parameterField("profile")]}
        hint={`Default: ${PROFILE_NAMES[DEFAULT_TRACK_PARAMETERS.profile]}.`}
      >
        {(described) => (
          <select {...described} name={parameterField("profile")} defaultValue={profile} className="input">
            {CYCLONE_PROFILES.map((value) => (
              <option key={value} value={value}>
                {PROFILE_NAMES[value]}
              </option>
            ))}
          </select>
        )}
      </Field>
      {NUMBERS.map((name) => {
        const { label, unit, source } = TRACK_NUMBERS[name];
        return (
          <Field
            key={name}
            id={`${id}-${name}`}
            label={label}
            unit={unit === "1" ? undefined : unit}
            optional={name === "B"}
            errors={errors[parameterField(name)]}
            hint={`Default: ${defaults[name] === "" ? "none" : defaults[name]}. Source: ${source}.`}
          >
            {(described) => (
              <input
                {...described}
                name={parameterField(name)}
                defaultValue={values[name]}
                inputMode="decimal"
                autoComplete="off"
                className="input"
              />
            )}
          </Field>
        );
      })}
      <label className="flex items-start gap-2.5">
        <input
          type="checkbox"
          name={parameterField("rain")}
          defaultChecked={rain}
          className="mt-1 size-4 shrink-0 accent-ink"
        />
        <span>
          Climatological rain
          <span className="block text-small text-quiet">
            Default: on. Tuleya, DeMaria &amp; Kuligowski (2007); single eyewalls bring 2 to 4 times as much (from
            memory).
          </span>
        </span>
      </label>
    </div>
  );
}
