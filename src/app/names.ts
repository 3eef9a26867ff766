/** Which craft this tab shows, and names for new ones. */

/** A name that no other craft or page has. */
export const freshId = (): string =>
  `${Date.now().toString(36)}-${Math.floor(Math.random() * 2 ** 40).toString(36)}`;

/** "Heron", or "Heron 2" when that is taken. */
export function freeName(name: string, taken: ReadonlySet<string>): string {
  for (let n = 1; ; n++) {
    const free = n === 1 ? name : `${name.slice(0, 190)} ${n}`;
    if (!taken.has(free)) return free;
  }
}

const KEY = 'steelyard craft';

/** The craft this tab showed last, which need not be the last one of all tabs. */
export function craftOfTab(): string | null {
  try {
    return sessionStorage.getItem(KEY);
  } catch {
    return null;
  }
}

export function rememberForTab(id: string): void {
  try {
    sessionStorage.setItem(KEY, id);
  } catch {
    // A browser that refuses storage still has the last craft of all tabs, or none.
  }
}
