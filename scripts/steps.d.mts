/** What TypeScript may know of steps.mjs, which stays plain JavaScript because it runs before anything is installed. */
export const ROOT: string;
export const NEXT: string;
export const TSX: string;
export function build(): Promise<number>;
export function freePort(port: number): Promise<number | null>;
export function run(command: string, args: readonly string[], options?: { env?: Readonly<Record<string, string>>; quiet?: boolean }): Promise<{ code: number; output: string }>;
