import { Form } from "react-router";
import { Field } from "~/components/field";
import { FLAG_CHOICE_LABELS, FLAG_CHOICES, type FlagFilter, type ReadFilter } from "~/quality/flag-filter";
import { TEST_NAMES } from "~/quality/thresholds";

interface FlagFilterFormProps {
  filter: FlagFilter;
  channels: readonly { channel: string; label: string }[];
  /** As they stand in the address. */
  written: { from: string; to: string };
  problems: ReadFilter["problems"];
  zone: string;
}

/** Chooses what the flags table shows; the choice stands in the page's address. */
export function FlagFilterForm({ filter, channels, written, problems, zone }: FlagFilterFormProps) {
  return (
    <Form method="get" preventScrollReset className="grid items-start gap-x-4 gap-y-3 sm:grid-cols-2 lg:grid-cols-6">
      <Field id="filter-channel" label="Channel">
        {(described) => (
          <select {...described} name="channel" defaultValue={filter.channel ?? ""} className="input">
            <option value="">all</option>
            {channels.map(({ channel, label }) => (
              <option key={channel} value={channel}>
                {label}
              </option>
            ))}
          </select>
        )}
      </Field>
      <Field id="filter-test" label="Test">
        {(described) => (
          <select {...described} name="test" defaultValue={filter.test ?? ""} className="input">
            <option value="">all together</option>
            {TEST_NAMES.map((test) => (
              <option key={test}>{test}</option>
            ))}
          </select>
        )}
      </Field>
      <Field id="filter-flag" label="Flag">
        {(described) => (
          <select {...described} name="flag" defaultValue={filter.flag} className="input">
            {FLAG_CHOICES.map((choice) => (
              <option key={choice} value={choice}>
                {FLAG_CHOICE_LABELS[choice]}
              </option>
            ))}
          </select>
        )}
      </Field>
      {(["from", "to"] as const).map((end) => (
        <Field
          key={end}
          id={`filter-${end}`}
          label={end === "from" ? "From" : "To"}
          unit={zone}
          errors={problems[end]}
          optional
        >
          {(described) => (
            <input
              {...described}
              name={end}
              defaultValue={written[end]}
              placeholder="2026-11-04 20:00"
              inputMode="numeric"
              autoComplete="off"
              className="input"
            />
          )}
        </Field>
      ))}
      <div className="self-end">
        <button type="submit" className="button">
          Show
        </button>
      </div>
    </Form>
  );
}
