/** Crafts to plan for, at random: a 3 m spheroid with something wrong with it, and the means to put it right. */
import fc from 'fast-check';
import { blankCraft } from '../../../src/craft/blank.ts';
import { type Craft, keyed } from '../../../src/craft/craft.ts';
import type { HullShape } from '../../../src/craft/hullSchema.ts';
import type { Place } from '../../../src/craft/placeSchema.ts';
import type { LeadPiece, Load, Slide } from '../../../src/craft/planningSchema.ts';
import type { Hardpoint } from '../../../src/craft/schema.ts';
import { partOf, wireOf } from '../../edit/craftFixture.ts';
import { loadOf } from '../../edit/planningFixture.ts';

/** One object for all, so that the hull is formed once. */
export const SHAPE: HullShape = { kind: 'spheroid', length: 3, diameter: 1 };
const GROSS_LIFT = 1.59;
/** Film and reader; about what a wire run weighs. kg */
const FIXED = 0.4;
const WIRE = 0.035;

/** Evenly spread: fast-check's own doubles crowd at the ends, where little can be flown. */
const double = (min: number, max: number) =>
  fc.noBias(fc.integer({ min: 0, max: 1_000_000 })).map((n) => min + ((max - min) * n) / 1_000_000);
const degrees = Math.PI / 180;

export interface Want {
  /** Curved slides and wires, so that the plan has to iterate. Default false. */
  readonly curved?: boolean;
  /** Pieces of lead instead of ballast cut to measure. Default false. */
  readonly pieces?: boolean;
  /** How many useful loads there may be. Default 0. */
  readonly loads?: number;
  /** Whether anything slides. Default true. */
  readonly slides?: boolean;
  /** Further out of trim, with less room to put it right. Default false. */
  readonly hard?: boolean;
  /** Half-widths of masses as a share of them. Default 0. */
  readonly tolerance?: number;
}

const keel = (station: number): Place => ({ kind: 'keel', station, drop: 0.03 });
const axis = (station: number): Place => ({ kind: 'axis', station });

const SPOTS: readonly (readonly [string, Place])[] = [
  ['nose', axis(0.05)],
  ['tail', axis(2.95)],
  ['port', { kind: 'skin', station: 1.4, clock: 1.5 * Math.PI, standoff: 0 }],
  ['starboard', { kind: 'skin', station: 1.6, clock: 0.5 * Math.PI, standoff: 0 }],
];

export function randomCraft(want: Want = {}): fc.Arbitrary<Craft> {
  const { curved = false, pieces = false, loads = 0, slides = true, hard = false, tolerance = 0 } = want;
  return fc
    .record({
      thruster: double(0.05, 0.2),
      battery: double(0.1, 0.4),
      batteryAt: double(0.4, 2.4),
      side: hard ? double(0.1, 0.5) : double(0, 0.1),
      hang: double(0.03, 0.3),
      deck: double(-0.2, 0.05),
      slide: hard ? fc.tuple(double(0.8, 1.2), double(1.2, 1.5)) : fc.tuple(double(0.3, 1.2), double(1, 2.6)),
      spots: fc.subarray([0, 1, 2, 3], { minLength: hard ? 4 : 2 }),
      limits: fc.array(hard ? double(0.005, 0.1) : double(0.02, 0.4), { minLength: 4, maxLength: 4 }),
      pitch: double(0.3, 6),
      heel: double(0.3, 6),
      band: fc.tuple(double(-0.3, -0.01), double(0, 0.3)),
      depth: double(0, 0.2),
      sizes: fc.uniqueArray(fc.constantFrom(1, 2, 5, 7, 10, 20), { minLength: 1, maxLength: 3 }),
      counts: fc.array(fc.integer({ min: 1, max: 4 }), { minLength: 3, maxLength: 3 }),
      loads: fc.array(randomLoad(curved), { minLength: 0, maxLength: loads }),
      wishes: fc.shuffledSubarray(['usefulLoad', 'fewestMoved', 'leastWire'] as const),
    })
    .map((given) => {
      const blank = blankCraft('Random', SHAPE, 3);
      const ends = [...given.slide].sort((a, b) => a - b);
      const slide: Slide | null = slides ? { from: ends[0]!, to: ends[1]! } : null;
      const place = curved ? keel : axis;
      const rest = GROSS_LIFT - FIXED - (curved ? WIRE : 0) - given.thruster - given.battery + given.deck;
      const toleranceOf = (mass: number) => tolerance * mass;
      const weight = (id: string, mass: number, at: Place, more = {}) =>
        partOf(id, { mass, massTolerance: toleranceOf(mass), place: at, ...more });
      return {
        ...blank,
        film: { ...blank.film, arealDensity: 0.045, arealDensityTolerance: tolerance * 0.045 },
        parts: keyed([
          weight('thruster', given.thruster, axis(2.9)),
          weight('battery', given.battery, place(given.batteryAt), { slide, kind: 'battery' }),
          weight(
            'reader',
            0.05,
            { kind: 'free', x: 1.2, y: given.side, z: -0.4 },
            { slide: slides ? { from: 1, to: 1.9 } : null },
          ),
          weight('deck', rest, { kind: 'keel', station: 1.5, drop: given.hang }),
        ]),
        wires: keyed(curved ? [wireOf('power')] : []),
        hardpoints: keyed(given.spots.map((spot, i) => hardpoint(spot, given.limits[i]!, pieces))),
        pieces: given.sizes.map((grams, i): LeadPiece => ({ mass: grams / 1000, count: given.counts[i]! })),
        loads: keyed(given.loads.map((load, i) => fitted(load, i, given.spots, toleranceOf))),
        leadAt: SPOTS[given.spots[0]!]![0],
        targets: {
          heaviness: { least: given.band[0], most: given.band[1] },
          pitchTolerance: given.pitch * degrees,
          heelTolerance: given.heel * degrees,
          leastPendulumDepth: given.depth,
          turnTime: null,
          sideGust: null,
        },
        wishes: given.wishes,
      };
    });
}

const hardpoint = (spot: number, limit: number, pieces: boolean): Hardpoint => {
  const [id, place] = SPOTS[spot]!;
  return { id, name: id, place, limit, fill: pieces ? 'pieces' : 'continuous' };
};

interface LoadGiven {
  readonly mass: number;
  readonly must: boolean;
  readonly rank: number;
  readonly at: readonly number[];
  readonly stretch: readonly [number, number] | null;
  readonly place: Place;
}

const randomLoad = (curved: boolean): fc.Arbitrary<LoadGiven> =>
  fc.record({
    mass: double(0.005, 0.08),
    must: fc.nat(3).map((n) => n === 0),
    rank: fc.integer({ min: 1, max: 2 }),
    at: fc.subarray([0, 1, 2, 3]),
    stretch: fc.option(fc.tuple(double(0.2, 2.8), double(0.2, 2.8))),
    place: fc.constant(curved ? keel(1.2) : axis(1.2)),
  });

/** A load that may go to hardpoints that the craft has. */
function fitted(
  { mass, must, rank, at, stretch, place }: LoadGiven,
  i: number,
  spots: readonly number[],
  toleranceOf: (mass: number) => number,
): Load {
  const [from, to] = [...(stretch ?? [])].sort((a, b) => a - b);
  return loadOf(`load-${i}`, {
    mass,
    massTolerance: toleranceOf(mass),
    must,
    rank,
    options: [
      ...at
        .filter((spot) => spots.includes(spot))
        .map((spot) => ({ kind: 'hardpoint' as const, hardpoint: SPOTS[spot]![0] })),
      ...(from !== undefined && to !== undefined ? [{ kind: 'slide' as const, place, from, to }] : []),
    ],
  });
}
