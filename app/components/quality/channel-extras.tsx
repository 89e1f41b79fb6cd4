import { Field } from "~/components/field";
import type { FormErrorsByField } from "~/storms/refusal";

interface ChannelExtrasProps {
  spikeMethod: "differential" | "average";
  seasons: string;
  unit: string;
  errors: FormErrorsByField;
  disabled: boolean;
}

/** What is no number: how a spike is found, and the seasons of the climatology. */
export function ChannelExtras({ spikeMethod, seasons, unit, errors, disabled }: ChannelExtrasProps) {
  return (
    <fieldset disabled={disabled} className="grid items-start gap-4 border-t border-hairline pt-3 sm:grid-cols-2">
      <legend className="sr-only">Way of the spike test, and seasons</legend>
      <Field
        id="threshold-spikeMethod"
        label="A spike is"
        hint="default: the smaller of two opposite steps, which leaves a front alone"
        errors={errors.spikeMethod}
      >
        {(described) => (
          <select {...described} name="spikeMethod" defaultValue={spikeMethod} className="input">
            <option value="differential">the smaller of two opposite steps</option>
            <option value="average">the distance from the mean of both neighbours</option>
          </select>
        )}
      </Field>
      <Field
        id="threshold-seasons"
        label="Climatology, suspect outside"
        unit={unit}
        hint="A line for each season, months first: 6-9: 0 to 45. default: none"
        errors={errors.seasons}
        optional
      >
        {(described) => <textarea {...described} name="seasons" rows={3} defaultValue={seasons} className="input" />}
      </Field>
    </fieldset>
  );
}
