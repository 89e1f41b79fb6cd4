import { WideTable } from "~/components/wide-table";
import type { CastRow, PresentedCast } from "~/water/present-cast";

/** What each column gave, so that a wrong unit shows at a glance. */
export function CastChannels({ cast }: { cast: PresentedCast }) {
  return (
    <>
      <WideTable label="Channels">
        <thead>
          <tr>
            <th scope="col">Channel</th>
            <th scope="col">From</th>
            <th scope="col">Unit</th>
            <th scope="col" className="number">
              Values
            </th>
            <th scope="col" className="number">
              Missing
            </th>
            <th scope="col" className="number">
              Lowest
            </th>
            <th scope="col" className="number">
              Highest
            </th>
          </tr>
        </thead>
        <tbody>
          {cast.channels.map(({ channel, from, unit, count, missing, min, max }) => (
            <tr key={channel}>
              <td>{channel}</td>
              <td className="min-w-36">{from}</td>
              <td className="whitespace-nowrap">{channel === "salinity" ? cast.salinityUnit : unit}</td>
              <td className="number">{count}</td>
              <td className="number">{missing}</td>
              <td className="number">{min}</td>
              <td className="number">{max}</td>
            </tr>
          ))}
        </tbody>
      </WideTable>
      {cast.leftOut.length > 0 && (
        <p className="mt-2 text-small text-quiet">Columns left out: {cast.leftOut.join(", ")}.</p>
      )}
    </>
  );
}

/** The uppermost and the deepest levels as they are taken over. */
export function CastRows({ cast }: { cast: PresentedCast }) {
  const heads = ["Depth (m)", "Pressure (dbar)", "Temperature (°C)", `Salinity (${cast.salinityUnit})`, "σ0 (kg/m³)"];
  return (
    <WideTable label="First and last levels">
      <thead>
        <tr>
          {heads.map((head) => (
            <th key={head} scope="col" className="number">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {cast.first.map((row) => (
          <Row key={row.depth} row={row} />
        ))}
        {cast.last.length > 0 && (
          <tr>
            <td colSpan={heads.length} className="text-center text-quiet">
              …
            </td>
          </tr>
        )}
        {cast.last.map((row) => (
          <Row key={row.depth} row={row} />
        ))}
      </tbody>
    </WideTable>
  );
}

function Row({ row }: { row: CastRow }) {
  const { depth, pressure, temperature, salinity, sigma0 } = row;
  return (
    <tr>
      {[depth, pressure, temperature, salinity, sigma0].map((text, index) => (
        <td key={index} className="number">
          {text}
        </td>
      ))}
    </tr>
  );
}
