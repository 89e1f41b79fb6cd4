import type { PresentedColumn, PresentedLayer } from "~/water/present-column";

const WIDTH = 320;
const HEIGHT = 236;
const LEFT = 64;
const SURFACE = 28;
const BASE = 122;
const BED = 222;

/** The two layers as drawn on the back of an envelope: not to scale, every number with its unit. */
export function LayerSketch({ column }: { column: PresentedColumn | null }) {
  const words = column ? describe(column) : "Two layers without numbers yet.";
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={words}
      className="w-full max-w-md border border-hairline bg-sheet"
      fontSize={12}
    >
      <path d={`M${LEFT},${SURFACE}H${WIDTH}V${BASE}H${LEFT}Z`} fill="var(--sea)" />
      <path d={`M${LEFT},${BASE}H${WIDTH}V${BED}H${LEFT}Z`} fill="var(--mist)" />
      <path d={surface()} fill="none" stroke="var(--ink)" strokeWidth={1.5} />
      <path
        d={`M${LEFT},${BASE}H${WIDTH}`}
        stroke="var(--density)"
        strokeWidth={1.5}
        strokeDasharray={column?.below ? undefined : "6,3"}
      />
      <text x={LEFT - 8} y={SURFACE + 4} textAnchor="end" fill="var(--slate)">
        surface
      </text>
      <text x={LEFT - 8} y={BASE + 4} textAnchor="end" fill="var(--density)" fontWeight="bold">
        {column?.layerDepth ?? "depth"}
      </text>
      <Layer y={SURFACE} heading="The layer the storm works on" layer={column?.layer ?? null} />
      <Layer y={BASE} heading="Water below" layer={column?.below ?? null} />
      {column?.densityStep && (
        <text x={WIDTH - 10} y={BASE - 6} textAnchor="end" fill="var(--density)">
          {column.stable ? "step" : "not stable: step"} {column.densityStep}
        </text>
      )}
    </svg>
  );
}

function Layer({ y, heading, layer }: { y: number; heading: string; layer: PresentedLayer | null }) {
  return (
    <>
      <text x={LEFT + 12} y={y + 22} fill="var(--slate)">
        {heading}
      </text>
      {layer ? (
        <>
          <text x={LEFT + 12} y={y + 44} fill="var(--heat)" fontWeight="bold">
            {layer.temperature}
          </text>
          <text x={LEFT + 92} y={y + 44} fill="var(--rain)" fontWeight="bold">
            {layer.salinity}
          </text>
          <text x={LEFT + 12} y={y + 64} fill="var(--density)">
            {layer.density}
          </text>
        </>
      ) : (
        <text x={LEFT + 12} y={y + 44} fill="var(--quiet)">
          not given
        </text>
      )}
    </>
  );
}

/** A line of small waves. */
function surface(): string {
  const waves = Array.from({ length: 8 }, () => "q8,-7 16,0t16,0").join("");
  return `M${LEFT},${SURFACE}${waves}`;
}

function describe({ layer, layerDepth, below, densityStep, stable }: PresentedColumn): string {
  const say = ({ temperature, salinity, density }: PresentedLayer) => `${temperature}, ${salinity}, ${density}`;
  const under = below
    ? `Below it ${say(below)}; density step ${densityStep}${stable ? "" : ", not stable"}.`
    : "Nothing given of the water below.";
  return `Layer of ${layerDepth}: ${say(layer)}. ${under}`;
}
