/** The executable, and where it was found. Rejects when CHROMIUM names a file that does not exist. */
export function findChromium(): Promise<{ path: string; from: string }>;
/** Flags under which the tests start it: no network of its own, no GPU. */
export const chromiumFlags: string[];
