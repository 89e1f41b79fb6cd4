import { type ReactNode, Suspense, useMemo } from "react";
import { useInBrowser } from "./use-in-browser";

interface MapFrameProps {
  /** What a map that cannot be drawn leaves the person with. */
  withoutMap: string;
  className?: string;
  children: ReactNode;
}

/**
 * Room for a map. The map itself (WebGL) is loaded in the browser only; where it cannot run a sentence stands in its
 * place, and the page around it stays of use.
 */
export function MapFrame({ withoutMap, className = "h-[26rem]", children }: MapFrameProps) {
  const inBrowser = useInBrowser();
  const drawable = useMemo(() => inBrowser && hasWebGl(), [inBrowser]);
  const waiting = <p className="p-4 text-small text-quiet">The map is being drawn…</p>;
  return (
    <div className={`relative w-full overflow-hidden border border-hairline bg-mist ${className}`}>
      {!inBrowser ? (
        waiting
      ) : drawable ? (
        <Suspense fallback={waiting}>{children}</Suspense>
      ) : (
        <p className="p-4 text-small">This browser cannot draw the map (WebGL 2 is off). {withoutMap}</p>
      )}
    </div>
  );
}

function hasWebGl(): boolean {
  return document.createElement("canvas").getContext("webgl2") !== null;
}
