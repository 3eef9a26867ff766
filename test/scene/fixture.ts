/** A craft for tests of the drawing: one part of every kind of place, a pair, a ring, two wire runs. */
import { blankCraft } from '../../src/craft/blank.ts';
import { type Craft, keyed } from '../../src/craft/craft.ts';
import type { Place } from '../../src/craft/placeSchema.ts';
import type { Part, WireRun } from '../../src/craft/schema.ts';
import { assess } from '../../src/report/assess.ts';
import { LIGHT } from '../../src/scene/palette.ts';
import { type Geometry, geometryOf, type Subject } from '../../src/scene/subject.ts';
import type { View } from '../../src/scene/view.ts';

export const part = (id: string, place: Place, more: Partial<Part> = {}): Part => ({
  id,
  kind: 'load',
  name: id,
  mass: 0.1,
  massTolerance: 0,
  massSource: 'estimated',
  place,
  copies: { kind: 'together', count: 1 },
  size: { length: 0.12, width: 0.06, height: 0.05 },
  cgOffset: 0,
  locked: false,
  slide: null,
  thruster: null,
  fin: null,
  dragArea: null,
  notes: '',
  ...more,
});

export const wire = (id: string, more: Partial<WireRun> = {}): WireRun => ({
  id,
  name: id,
  from: { kind: 'part', part: 'battery' },
  to: { kind: 'part', part: 'thruster' },
  path: { kind: 'skin', clock: Math.PI },
  massPerMetre: 0.01,
  conductors: 2,
  slack: 0,
  notes: '',
  ...more,
});

export const PARTS: readonly Part[] = [
  part('thruster', { kind: 'axis', station: 2.9 }, { kind: 'thruster', mass: 0.11 }),
  part('battery', { kind: 'keel', station: 1.2, drop: 0.04 }, { kind: 'battery', mass: 0.172 }),
  part('gondola', { kind: 'keel', station: 1.5, drop: 0.09 }, { kind: 'gondola' }),
  part('camera', { kind: 'free', x: 0.9, y: 0.1, z: -0.6 }, { kind: 'camera', mass: 0.03 }),
  part(
    'fins',
    { kind: 'skin', station: 2.5, clock: 0, standoff: 0.1 },
    {
      kind: 'fin',
      mass: 0.03,
      copies: { kind: 'ring', count: 3 },
      size: { length: 0.3, width: 0.004, height: 0.2 },
    },
  ),
  part(
    'motors',
    { kind: 'skin', station: 1.4, clock: 2, standoff: 0.05 },
    { kind: 'thruster', mass: 0.02, copies: { kind: 'pair' } },
  ),
];

export const craft = (
  parts: readonly Part[] = PARTS,
  wires: readonly WireRun[] = [wire('power')],
): Craft => ({
  ...blankCraft('Fixture', { kind: 'spheroid', length: 3, diameter: 1 }, 3),
  parts: keyed([...parts]),
  wires: keyed([...wires]),
});

export const subject = (of: Craft = craft()): Subject => ({
  craft: of,
  assessment: assess(of),
  units: 'metric',
  palette: LIGHT,
});

export const geometry = (of: Craft = craft()): Geometry => geometryOf(assess(of))!;

export const VIEW: View = {
  scale: 240,
  originX: 60,
  originY: 220,
  width: 840,
  height: 460,
  tilt: 0,
  pivot: 1.5,
};
