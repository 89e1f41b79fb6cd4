import { compassWord } from "~/units/compass";
import { formatBearing } from "~/units/format-quantity";

interface WindSenseProps {
  /** Degrees true, as written in the file. */
  written: number;
  sense: "from" | "towards";
}

const SIZE = 76;
const CENTRE = SIZE / 2;
const REACH = 25;
const HEAD = 7;

function point(bearing: number, distance: number): [number, number] {
  const angle = (bearing * Math.PI) / 180;
  return [CENTRE + distance * Math.sin(angle), CENTRE - distance * Math.cos(angle)];
}

/** The same number drawn in one of its two senses, so that a person who knows the coast sees which is right. */
export function WindSense({ written, sense }: WindSenseProps) {
  const towards = sense === "from" ? (written + 180) % 360 : written;
  const from = (towards + 180) % 360;
  const [x1, y1] = point(from, REACH);
  const [x2, y2] = point(towards, REACH);
  const [leftX, leftY] = point(towards - 12, REACH - HEAD);
  const [rightX, rightY] = point(towards + 12, REACH - HEAD);
  const words = `${formatBearing(written)}: blows from the ${compassWord(from)} towards the ${compassWord(towards)}`;
  return (
    <span className="flex items-center gap-3">
      <svg width={SIZE} height={SIZE} viewBox={`0 0 ${SIZE} ${SIZE}`} aria-hidden="true" className="shrink-0">
        <circle cx={CENTRE} cy={CENTRE} r={REACH + 4} fill="none" stroke="var(--hairline)" />
        <text x={CENTRE} y={8} textAnchor="middle" fontSize={9} fill="var(--quiet)">
          N
        </text>
        <line x1={x1} y1={y1} x2={x2} y2={y2} stroke="var(--wind)" strokeWidth={2} />
        <path d={`M${x2},${y2}L${leftX},${leftY}L${rightX},${rightY}Z`} fill="var(--wind)" />
      </svg>
      <span className="text-small text-slate">{words}</span>
    </span>
  );
}
