import { useSyncExternalStore } from "react";

/** Whether scripts run: false on the server and until the page has come alive. */
export function useScripted(): boolean {
  return useSyncExternalStore(
    () => () => undefined,
    () => true,
    () => false,
  );
}
