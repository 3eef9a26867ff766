/** The beam as a table: every mass with its station and its moment about the CB, drawn as a bar to nose or tail. */
import type { BeamBar, Geometry } from '../report/assessment.ts';
import { formatQuantity } from '../units/format.ts';
import type { UnitSystem } from '../units/units.ts';
import { left, oneLine, right } from './layout.ts';

const HALF = 9;

export function beamTable({ beam, lead, cb }: Geometry, units: UnitSystem): string[] {
  const longest = Math.max(...[...beam, ...(lead ? [lead] : [])].map(({ moment }) => Math.abs(moment)), 0);
  const line = (bar: BeamBar) => barLine(bar, longest, units);
  const heaviest = [...beam].sort((a, b) => Math.abs(b.moment) - Math.abs(a.moment));
  return [
    `Beam: moments about the CB at ${formatQuantity(cb[0], 'length', units)}, + tail-heavy`,
    columns('', 'mass', 'station', 'moment', `${right('nose', HALF)}|${left('tail', HALF)}`),
    ...heaviest.map(line),
    totalLine(beam, units),
    ...(lead ? [line({ ...lead, name: `Lead: ${lead.name}` })] : []),
  ];
}

function columns(name: string, mass: string, station: string, moment: string, drawn: string): string {
  const cells = [left(name, 25), right(mass, 10), right(station, 10), right(moment, 13)];
  return oneLine(`  ${cells.join('')} ${drawn}`).trimEnd();
}

function barLine(bar: BeamBar, longest: number, units: UnitSystem): string {
  const { name, mass, station, moment } = bar;
  return columns(
    name,
    formatQuantity(mass, 'mass', units),
    formatQuantity(station, 'length', units),
    formatQuantity(moment, 'momentMass', units),
    drawn(moment, longest),
  );
}

function drawn(moment: number, longest: number): string {
  const marks = longest > 0 ? Math.round((HALF * Math.abs(moment)) / longest) : 0;
  const bar = '#'.repeat(marks);
  return moment < 0 ? `${right(bar, HALF)}|` : `${' '.repeat(HALF)}|${bar}`;
}

function totalLine(beam: readonly BeamBar[], units: UnitSystem): string {
  const mass = beam.reduce((sum, bar) => sum + bar.mass, 0);
  const moment = beam.reduce((sum, bar) => sum + bar.moment, 0);
  return columns(
    'Sum',
    formatQuantity(mass, 'mass', units),
    '',
    formatQuantity(moment, 'momentMass', units),
    '',
  );
}
