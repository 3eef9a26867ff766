/** What the loading gate says of one thing that is wrong with a file. */
export interface Problem {
  /** What the thing at fault is called, when the file says so: “Gondola”. */
  readonly name?: string;
  /** Path of the field, as `parts[2].place.station`; empty for the file as a whole. */
  readonly path: string;
  /** The value found, as short text. */
  readonly found: string;
  /** What is allowed there. */
  readonly allowed: string;
}

export const problemText = ({ name, path, found, allowed }: Problem): string =>
  `${path || 'file'}${name ? ` (“${name}”)` : ''}: found ${found}; allowed: ${allowed}`;

/** A path of keys and indices as it would be written in code. */
export const pathText = (path: readonly PropertyKey[]): string =>
  path.reduce<string>(
    (text, key) =>
      typeof key === 'number' ? `${text}[${key}]` : text ? `${text}.${String(key)}` : String(key),
    '',
  );

const LONGEST = 60;

/** A value in at most a line: long text and deep objects are cut. */
export function foundText(value: unknown): string {
  if (value === undefined) return 'nothing';
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (value !== null && typeof value === 'object') {
    const keys = Object.keys(value).slice(0, 4).join(', ');
    return keys ? `an object with ${cut(keys)}` : 'an empty object';
  }
  return cut(typeof value === 'string' ? JSON.stringify(value) : String(value));
}

const cut = (text: string): string => (text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text);

/** A name that stands for nothing, with some that would. */
export function unknownId(path: string, id: string, what: string, known: ReadonlySet<string>): Problem {
  const some = [...known].slice(0, 6).join(', ');
  const allowed = `the id of ${what} in this file${some ? ` (${some}${known.size > 6 ? ', …' : ''})` : ' (it has none)'}`;
  return { path, found: JSON.stringify(id), allowed };
}
