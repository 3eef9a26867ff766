/** A craft to start from: a hull and nothing on it. */
import type { Craft } from './craft.ts';
import { keyed } from './craft.ts';
import type { HullShape } from './hullSchema.ts';
import { WISHES } from './planningSchema.ts';
import type { Hardpoint } from './schema.ts';

/** What a hardpoint carries until the builder says otherwise: 10 kg is as good as no limit for a small blimp. */
export const BLANK_HARDPOINT = { limit: 10, fill: 'continuous' } as const satisfies Partial<Hardpoint>;

const degrees = Math.PI / 180;

/** An empty craft of that shape: thin film, helium of a filling station's purity, an indoor day, one hardpoint on the nose. Every one of these is a first guess to be changed. */
export const blankCraft = (name: string, shape: HullShape, length: number): Craft => ({
  name,
  notes: '',
  hull: { shape, seams: { massPerMetre: 0, count: 0 }, patches: [] },
  film: { name: 'Film', arealDensity: 0.03, arealDensityTolerance: 0 },
  gas: { lifting: 'helium', purity: 0.98, superheat: 0, gaugePressure: 0 },
  day: { kind: 'measured', temperature: 293.15, pressure: 101_325, humidity: 0.5 },
  parts: keyed([]),
  wires: keyed([]),
  hardpoints: keyed([
    { id: 'nose', name: 'Nose', place: { kind: 'axis', station: 0.02 * length }, ...BLANK_HARDPOINT },
  ]),
  pieces: [],
  loads: keyed([]),
  leadAt: 'nose',
  support: null,
  targets: {
    heaviness: { least: -0.01, most: 0.02 },
    pitchTolerance: 2 * degrees,
    heelTolerance: 2 * degrees,
    leastPendulumDepth: 0.01,
    turnTime: null,
    sideGust: null,
  },
  wishes: [...WISHES],
});
