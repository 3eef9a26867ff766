/** A small craft of every sort of entry, for tests. */
import { BLANK_HARDPOINT, blankCraft } from '../../src/craft/blank.ts';
import { type Craft, keyed } from '../../src/craft/craft.ts';
import type { Part, WireRun } from '../../src/craft/schema.ts';

export const partOf = (id: string, change: Partial<Part> = {}): Part => ({
  id,
  kind: 'fitting',
  name: id,
  mass: 0.1,
  massTolerance: 0.005,
  massSource: 'estimated',
  place: { kind: 'axis', station: 1 },
  copies: { kind: 'together', count: 1 },
  size: { length: 0.1, width: 0.05, height: 0.05 },
  cgOffset: 0,
  locked: false,
  slide: null,
  thruster: null,
  fin: null,
  dragArea: null,
  notes: '',
  ...change,
});

export const wireOf = (id: string, change: Partial<WireRun> = {}): WireRun => ({
  id,
  name: id,
  from: { kind: 'part', part: 'battery' },
  to: { kind: 'part', part: 'thruster' },
  path: { kind: 'skin', clock: Math.PI },
  massPerMetre: 0.004,
  conductors: 3,
  slack: 0.05,
  notes: '',
  ...change,
});

export function fixtureCraft(): Craft {
  const craft = blankCraft('Fixture', { kind: 'spheroid', length: 3, diameter: 1 }, 3);
  return {
    ...craft,
    parts: keyed([
      partOf('thruster', { kind: 'thruster', place: { kind: 'axis', station: 2.97 } }),
      partOf('battery', { kind: 'battery', place: { kind: 'keel', station: 1.3, drop: 0.03 } }),
      partOf('fins', {
        kind: 'fin',
        place: { kind: 'skin', station: 2.6, clock: 0, standoff: 0.1 },
        copies: { kind: 'ring', count: 3 },
      }),
      partOf('lights', {
        place: { kind: 'free', x: 1.2, y: 0.3, z: -0.3 },
        copies: { kind: 'pair' },
      }),
    ]),
    wires: keyed([wireOf('power')]),
    hardpoints: keyed([
      { id: 'nose', name: 'Nose', place: { kind: 'axis', station: 0.05 }, ...BLANK_HARDPOINT },
      { id: 'chin', name: 'Chin', place: { kind: 'keel', station: 0.6, drop: 0 }, ...BLANK_HARDPOINT },
    ]),
  };
}
