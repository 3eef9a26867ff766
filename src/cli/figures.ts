/** Every figure of the report, in groups. */
import type { Row } from '../report/row.ts';
import { rowText } from '../report/rowText.ts';
import type { UnitSystem } from '../units/units.ts';
import { COLUMNS, left, oneLine, wrapped } from './layout.ts';

/** The group of a row, by the first word of its key. */
const GROUPS: Readonly<Record<string, string>> = {
  hull: 'Hull',
  air: 'Air, gas and mass',
  gas: 'Air, gas and mass',
  lift: 'Air, gas and mass',
  mass: 'Air, gas and mass',
  heaviness: 'Air, gas and mass',
  cg: 'Floating free',
  float: 'Floating free',
  lead: 'Lead',
  oneWeight: 'One weight to level it and use up the lift',
  support: 'On its support',
  turn: 'Turning',
  glide: 'Turning, with the throttle cut',
  speed: 'Speed',
  drag: 'Speed',
  thrust: 'Speed',
  power: 'Speed',
  cruise: 'Pitch',
  climb: 'Pitch',
  hover: 'Pitch',
  inflow: 'Inflow',
  added: 'Added mass and inertia',
  inertia: 'Added mass and inertia',
};

const LABEL = 38;
const VALUE = 22;

export function figures(rows: Readonly<Record<string, Row>>, units: UnitSystem): string[] {
  const told = new Set(['']);
  const entries = Object.entries(rows).map(([key, row]) => ({
    title: titleOf(key),
    lines: figure(row, told, units),
  }));
  const titles = [...new Set(entries.map(({ title }) => title))];
  return titles.flatMap((title) => [
    title,
    ...entries.filter((entry) => entry.title === title).flatMap(({ lines }) => lines),
    '',
  ]);
}

const titleOf = (key: string): string => GROUPS[key.split('.')[0]!] ?? 'Other figures';

/** Each sentence is told once; a figure that fails for the same reason says "as above". */
function figure(row: Row, told: Set<string>, units: UnitSystem): string[] {
  const line = oneLine(`  ${left(row.label, LABEL)}${left(rowText(row, units), VALUE)}`);
  if (told.has(row.why)) return [(row.value === null ? `${line.trimEnd()}, as above` : line).trimEnd()];
  told.add(row.why);
  const why = oneLine(row.why);
  if (row.status === 'solved' && line.length + why.length <= COLUMNS) return [line + why];
  return [line.trimEnd(), ...wrapped(why, 6)];
}
