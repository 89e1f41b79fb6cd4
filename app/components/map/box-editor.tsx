import { type KeyboardEvent, lazy, useRef, useState } from "react";
import { BoxFacts } from "./box-facts";
import { CoordinateField } from "./coordinate-field";
import { MapFrame } from "./map-frame";
import { useRingEditing } from "./use-ring-editing";
import { type BoxProblem, checkBox } from "~/area/check-box";
import type { Position } from "~/ocean/scenario";
import type { UnitChoices } from "~/units/unit-choices";

/** What the pointer does on the map. */
export type DrawingTool = "edit" | "rectangle" | "polygon";

const TOOLS: { tool: DrawingTool; name: string; hint: string }[] = [
  { tool: "rectangle", name: "Rectangle", hint: "Click one corner, then the opposite one; or drag. Esc ends it." },
  { tool: "polygon", name: "Polygon", hint: "Click corner after corner; click the first one to close. Esc ends it." },
  {
    tool: "edit",
    name: "Edit",
    hint: "Drag a corner, or the box. A small handle between two corners makes a new one. Right-click takes a corner away.",
  },
];

interface BoxEditorProps {
  /** Corners as [longitude, latitude] in degrees, open or closed; null for no box yet. */
  value: Position[] | null;
  onChange: (ring: Position[] | null) => void;
  otherBoxes: { name: string; polygon: Position[] }[];
  units: UnitChoices;
  /** What the server found wrong. */
  errors?: string[];
  /** Name of the hidden field that carries the corners as JSON; empty while the text cannot be read. */
  name?: string;
}

const DrawingMap = lazy(() => import("./drawing-map.client"));

/**
 * Draws and changes one study box: on the map and, equally, as text. Works inside a plain form and without a pointer;
 * where the map cannot be drawn the text field stands alone.
 */
export function BoxEditor({ value, onChange, otherBoxes, units, errors = [], name = "polygon" }: BoxEditorProps) {
  const editing = useRingEditing(value, onChange);
  const [tool, setTool] = useState<DrawingTool>(value === null ? "rectangle" : "edit");
  const text = useRef<HTMLDivElement>(null);
  const { ring } = editing;
  const checked = ring === null ? null : checkBox(ring);
  const problems = problemsOf(editing.textProblems, checked?.ok === false ? checked.problems : [], errors);
  const warnings = checked?.ok ? checked.warnings.map(({ message }) => message) : [];

  const onKeyDown = (event: KeyboardEvent) => {
    if (!(event.ctrlKey || event.metaKey) || event.key.toLowerCase() !== "z") return;
    // In the text field the browser's own undo works letter by letter.
    if (event.target instanceof HTMLTextAreaElement) return;
    event.preventDefault();
    if (event.shiftKey) editing.redo();
    else editing.undo();
  };
  const leaveMap = () => text.current?.querySelector("textarea")?.focus();

  return (
    <div className="grid gap-4 lg:grid-cols-[3fr_2fr]" onKeyDown={onKeyDown}>
      <input type="hidden" name={name} value={ring && editing.textProblems.length === 0 ? JSON.stringify(ring) : ""} />
      <div className="grid min-w-0 content-start gap-2">
        <div className="flex flex-wrap gap-2" role="group" aria-label="Drawing on the map">
          {TOOLS.map(({ tool: id, name: label }) => (
            <button
              key={id}
              type="button"
              className={`button ${id === tool ? "button-primary" : ""}`}
              aria-pressed={id === tool}
              disabled={id === "edit" && ring === null}
              onClick={() => setTool(id)}
            >
              {label}
            </button>
          ))}
          <button type="button" className="button" disabled={!editing.canUndo} onClick={editing.undo}>
            Undo
          </button>
          <button type="button" className="button" disabled={!editing.canRedo} onClick={editing.redo}>
            Redo
          </button>
          <button
            type="button"
            className="button"
            disabled={ring === null}
            onClick={() => {
              editing.commit(null);
              setTool("rectangle");
            }}
          >
            Delete
          </button>
        </div>
        <MapFrame withoutMap="Type the corners; everything else works as usual." className="h-80 sm:h-[28rem]">
          <DrawingMap
            ring={ring}
            tool={tool}
            onTool={setTool}
            onPreview={editing.preview}
            onCommit={editing.commit}
            onLeave={leaveMap}
            otherBoxes={otherBoxes}
            units={units}
          />
        </MapFrame>
        <p className="text-small text-quiet">{TOOLS.find(({ tool: id }) => id === tool)?.hint}</p>
      </div>
      <div ref={text} className="grid min-w-0 content-start gap-4">
        <CoordinateField editing={editing} problems={problems} warnings={warnings} />
        <BoxFacts ring={checked?.ok ? checked.ring : null} units={units} />
      </div>
    </div>
  );
}

/** The text's problems first; what is wrong with the shape only once all of the text could be read. */
function problemsOf(text: { message: string }[], box: BoxProblem[], errors: string[]): string[] {
  if (text.length > 0) return text.map(({ message }) => message);
  const messages = box.map(({ message }) => message);
  return [...messages, ...errors.filter((error) => !messages.includes(error))];
}
