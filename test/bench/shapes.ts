/** One hull of every form, of about the same size. */
import type { HullShape } from '../../src/craft/hullSchema.ts';

const widths = (share: number) =>
  Array.from({ length: 25 }, (_, i) => ({
    tape: (4.3 * i) / 24,
    width: share * Math.sin((Math.PI * i) / 24) ** 0.8,
  }));

export const benchShapes: Readonly<Record<HullShape['kind'], HullShape>> = {
  spheroid: { kind: 'spheroid', length: 4, diameter: 1.3 },
  twoSpheroid: { kind: 'twoSpheroid', foreLength: 1.6, aftLength: 2.4, diameter: 1.3 },
  naca4: { kind: 'naca4', length: 4, diameter: 1.2, tail: 'closed' },
  series58: {
    kind: 'series58',
    length: 4,
    diameter: 1.2,
    widest: 0.4,
    noseRadius: 0.5,
    tailRadius: 0.1,
    prismatic: 0.65,
  },
  myring: {
    kind: 'myring',
    noseLength: 0.8,
    middleLength: 1.6,
    tailLength: 1.6,
    diameter: 1.2,
    nosePower: 2,
    tailAngle: 0.44,
    noseOffset: 0.02,
    tailOffset: 0.05,
  },
  cylinder: {
    kind: 'cylinder',
    diameter: 1.2,
    noseEnd: 'ellipsoid',
    noseLength: 0.8,
    middleLength: 2,
    tailEnd: 'ogive',
    tailLength: 1.2,
  },
  offsets: {
    kind: 'offsets',
    along: 'station',
    across: 'diameter',
    rows: Array.from({ length: 25 }, (_, i) => ({
      at: (4 * i) / 24,
      size: 1.3 * Math.sqrt(Math.max(0, 1 - (i / 12 - 1) ** 2)),
    })),
  },
  gores: { kind: 'gores', count: 8, rows: widths(0.5) },
  twoSheet: { kind: 'twoSheet', rows: widths(1.9) },
  roundTwoSheet: { kind: 'roundTwoSheet', flatDiameter: 1.5, stance: 'lying' },
};
