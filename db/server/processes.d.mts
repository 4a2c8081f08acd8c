/** What makes a process the same one also after numbers were given anew. */
export type ProcessIdentity = { pid: number; ticks: string; boot: string };
export function identity(pid: number): ProcessIdentity | undefined;
