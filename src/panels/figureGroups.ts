/** The rows of the report under headings, by the first word of their key. */
import type { Row } from '../report/row.ts';

export interface FigureGroup {
  readonly title: string;
  readonly rows: readonly { readonly key: string; readonly row: Row }[];
}

const GROUPS: readonly { title: string; prefixes: readonly string[] }[] = [
  { title: 'Hull', prefixes: ['hull'] },
  { title: 'Air, gas and lift', prefixes: ['air', 'gas', 'lift'] },
  { title: 'Mass', prefixes: ['mass', 'cg', 'heaviness'] },
  { title: 'How it floats', prefixes: ['float'] },
  { title: 'Lead', prefixes: ['lead'] },
  { title: 'One weight', prefixes: ['oneWeight'] },
  { title: 'On its support', prefixes: ['support'] },
];

/** Every row stands in one group; what fits none comes last. */
export function figureGroups(rows: Readonly<Record<string, Row>>): FigureGroup[] {
  const known = new Set(GROUPS.flatMap(({ prefixes }) => prefixes));
  const entries = Object.entries(rows).map(([key, row]) => ({ key, row, prefix: key.split('.')[0]! }));
  const groups = [
    ...GROUPS.map(({ title, prefixes }) => ({
      title,
      rows: entries.filter(({ prefix }) => prefixes.includes(prefix)),
    })),
    { title: 'More', rows: entries.filter(({ prefix }) => !known.has(prefix)) },
  ];
  return groups.filter((group) => group.rows.length > 0);
}
