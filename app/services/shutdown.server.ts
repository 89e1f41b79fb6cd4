/**
 * What must be closed before the process ends. The server entry and the routes are two bundles of one process,
 * so the list hangs on the process and not on a module.
 */
interface Closing {
  name: string;
  close: () => Promise<void>;
}

const KEY = Symbol.for("galeprint.closings");
const holder = globalThis as { [KEY]?: Closing[] };

export function onShutdown(name: string, close: () => Promise<void>): void {
  (holder[KEY] ??= []).push({ name, close });
}

/** Closes the last opened first; one that fails does not keep the others open. */
export async function closeEverything(): Promise<{ name: string; error: unknown }[]> {
  const failures: { name: string; error: unknown }[] = [];
  for (const { name, close } of (holder[KEY] ?? []).splice(0).reverse()) {
    await close().catch((error: unknown) => failures.push({ name, error }));
  }
  return failures;
}
