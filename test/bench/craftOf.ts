/** Craft of any size for the bench: every kind of place and copies, a wire run for every fifth part. */
import { blankCraft } from '../../src/craft/blank.ts';
import { type Craft, keyed } from '../../src/craft/craft.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import { PART_KINDS, type Part, type WireRun } from '../../src/craft/schema.ts';

export function craftOf(parts: number): Craft {
  const craft = blankCraft(`${parts} parts`, { kind: 'spheroid', length: 4, diameter: 1.3 }, 4);
  return {
    ...craft,
    parts: keyed(Array.from({ length: parts }, (_, i) => partAt(i, parts))),
    wires: keyed(Array.from({ length: Math.floor(parts / 5) }, (_, i) => wireAt(i, parts))),
  };
}

const partAt = (i: number, parts: number): Part => ({
  id: `part-${i}`,
  kind: PART_KINDS[i % PART_KINDS.length]!,
  name: `Part ${i}`,
  mass: 0.8 / parts,
  massTolerance: 0.02 / parts,
  massSource: 'estimated',
  place: placeAt(i, 0.2 + (3.6 * i) / parts),
  copies: i % 10 === 0 ? { kind: 'pair' } : { kind: 'together', count: 1 },
  size: { length: 0.06, width: 0.03, height: 0.03 },
  cgOffset: 0,
  locked: false,
  slide: null,
  thruster: null,
  fin: null,
  dragArea: null,
  notes: '',
});

function placeAt(i: number, station: number): Place {
  switch (i % 4) {
    case 0:
      return { kind: 'skin', station, clock: (i * 0.7) % 6, standoff: 0.02 };
    case 1:
      return { kind: 'keel', station, drop: 0.03 };
    case 2:
      return { kind: 'axis', station };
    default:
      return { kind: 'free', x: station, y: 0.1, z: -0.4 };
  }
}

const wireAt = (i: number, parts: number): WireRun => ({
  id: `run-${i}`,
  name: `Run ${i}`,
  from: { kind: 'part', part: `part-${(i * 5) % parts}` },
  to: { kind: 'part', part: `part-${(i * 5 + 7) % parts}` },
  path: i % 3 === 0 ? { kind: 'straight' } : { kind: 'skin', clock: Math.PI },
  massPerMetre: 0.003,
  conductors: 2,
  slack: 0.05,
  notes: '',
});
