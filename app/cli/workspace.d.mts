import type { ChildProcess, SpawnOptions } from "node:child_process";

export const root: string;
export function findProgram(...names: string[]): string | undefined;
export function findChromium(): string | undefined;
export function packagesMatchLock(): boolean;
export function buildIsCurrent(): boolean;
export function stopChildren(signal: NodeJS.Signals): void;
export function start(command: string, args: string[], options?: SpawnOptions): ChildProcess;
export function run(
  command: string,
  args: string[],
  options?: { env?: Record<string, string>; show?: boolean },
): Promise<{ code: number; output: string }>;
export function tail(output: string, lines?: number): string;
