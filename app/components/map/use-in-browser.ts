import { useSyncExternalStore } from "react";

const never = () => () => {};

/** False while the server renders and while React takes its page over, true from then on. */
export function useInBrowser(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
