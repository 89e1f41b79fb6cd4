import { useId } from "react";
import { Form, useSubmit } from "react-router";

interface BoxChoiceProps {
  boxes: { id: string; name: string }[];
  box: { id: string; name: string } | null;
}

/** At which study box a track's wind is shown: it differs from box to box. */
export function BoxChoice({ boxes, box }: BoxChoiceProps) {
  const id = useId();
  const submit = useSubmit();
  if (!box) return <p className="text-slate">Draw a study box first: the wind is computed at its middle.</p>;
  return (
    <Form method="get" className="mb-3 flex flex-wrap items-end gap-3" preventScrollReset>
      <div className="min-w-0">
        <label htmlFor={id} className="mb-1 block text-small font-bold text-slate">
          Study box
        </label>
        <select
          id={id}
          name="box"
          key={box.id}
          defaultValue={box.id}
          className="input max-w-80"
          onChange={(event) => void submit(event.currentTarget.form, { preventScrollReset: true })}
        >
          {boxes.map((entry) => (
            <option key={entry.id} value={entry.id}>
              {entry.name}
            </option>
          ))}
        </select>
      </div>
      <noscript>
        <button className="button">Show</button>
      </noscript>
    </Form>
  );
}
