/**
 * What the propellers of a thruster would strike where it sits: skin, ground, other parts, other propellers; and whether
 * it stands beyond the hull. Geometry of the craft as drawn and level, wires and bending left out.
 */
import { listed } from '../../craft/craft.ts';
import type { Part } from '../../craft/schema.ts';
import { say } from '../../units/sentence.ts';
import type { CraftState } from '../craftState.ts';
import { positionOf } from '../mass/position.ts';
import { type Thruster, thrustersOf } from '../thrust/thrusters.ts';
import { type Box, footOf, gapToFellow, gapToPropeller, gapToSkin, passesThrough } from './nearness.ts';
import { clearanceOf, lowestOf, type Sweep, sweepOf } from './sweep.ts';

export interface Strikes {
  /** One sentence each, what is the matter before its colon, by how much after it. */
  readonly cautions: readonly string[];
  /** Whether one of them rules the place out: not that it stands beyond the hull, nor what is meant. */
  readonly strikes: boolean;
}

/** What is so where the thruster sits today, and taken to be meant. */
export interface Meant {
  /** Fittings in the way of the blades: the mount, whose box is coarse and which goes wherever the thruster goes. */
  readonly mounts: ReadonlySet<string>;
  /** The propeller is the lowest of the craft: it is launched and caught by hand. Told at every station, it rules none out. */
  readonly lowest: boolean;
  /** The parts there are; null where no plan has hung any other. */
  readonly aboard: ReadonlySet<string> | null;
}

const NOTHING_MEANT: Meant = { mounts: new Set(), lowest: false, aboard: null };

export function meantOf(state: CraftState, part: string): Meant {
  const { sweeps, room } = propellersOf(state, part);
  const inWay = partsInWay(state, part, sweeps, NOTHING_MEANT);
  return {
    mounts: new Set(inWay.filter(({ kind }) => kind === 'fitting').map(({ id }) => id)),
    lowest: groundWords(state, part, sweeps, room).length > 0,
    aboard: new Set(state.craft.parts.order),
  };
}

export function strikesOf(state: CraftState, part: string, meant = NOTHING_MEANT): Strikes {
  const { own, others, sweeps, room } = propellersOf(state, part);
  const ground = groundWords(state, part, sweeps, room);
  const strikes = [
    ...skinWords(
      leastOf(sweeps, (sweep) => gapToSkin(sweep, state.hull, room)),
      room,
    ),
    ...partsInWay(state, part, sweeps, meant).map(
      (each) => `The propeller would strike ${struckName(each, meant)}.`,
    ),
    ...propellerWords(sweeps, others, room),
    ...fellowWords(sweeps, room),
  ];
  return {
    cautions: [...strikes, ...ground, ...beyondWords(own, state.hull.length)],
    strikes: strikes.length > 0 || (ground.length > 0 && !meant.lowest),
  };
}

const struckName = ({ id, name, kind }: Part, { aboard }: Meant): string =>
  `${name || kind}${aboard && !aboard.has(id) ? ' (hung by the plan)' : ''}`;

function propellersOf(state: CraftState, part: string) {
  const thrusters = thrustersOf(state);
  const own = thrusters.filter((thruster) => thruster.part === part);
  return {
    own,
    others: thrusters.filter((thruster) => thruster.part !== part),
    sweeps: own.map(sweepOf),
    room: clearanceOf(Math.max(...own.map(({ diameter }) => diameter))),
  };
}

const leastOf = (sweeps: readonly Sweep[], gap: (sweep: Sweep) => number): number =>
  Math.min(...sweeps.map(gap));

const tooNear = (who: string, what: string, gap: number, room: number): string =>
  `${who} comes too near ${what}: within ${say(gap, 'smallLength')} of it; keep ${say(room, 'smallLength')} clear.`;

function skinWords(gap: number, room: number): string[] {
  if (gap >= room - DUST) return [];
  return gap < 0
    ? [`The propeller would strike the skin: it reaches ${say(-gap, 'smallLength')} into it.`]
    : [tooNear('The propeller', 'the skin', gap, room)];
}

/** Less than this is rounding, m. */
const DUST = 1e-9;

function groundWords(state: CraftState, part: string, sweeps: readonly Sweep[], room: number): string[] {
  const below = lowestElse(state, part) - Math.min(...sweeps.map(lowestOf));
  if (below <= DUST - room) return [];
  return below > 0
    ? [
        `At rest the propeller would strike the ground first: all else ends ${say(below, 'smallLength')} higher.`,
      ]
    : [tooNear('At rest the propeller', 'the ground', -below, room)];
}

/** Of hull, support and all other parts, m. */
function lowestElse(state: CraftState, part: string): number {
  const { craft, hull } = state;
  const support = craft.support ? [positionOf(craft.support, hull)[2]] : [];
  return Math.min(
    -hull.height / 2,
    ...support,
    ...listed(craft.parts).flatMap(({ id }) => (id === part ? [] : boxesOf(state, id).map(footOf))),
  );
}

const boxesOf = ({ craft, pieces }: CraftState, part: string): Box[] =>
  pieces[part]!.map((piece) => ({ piece, size: craft.parts.byId[part]!.size }));

const partsInWay = (state: CraftState, part: string, sweeps: readonly Sweep[], { mounts }: Meant): Part[] =>
  listed(state.craft.parts).filter(
    ({ id }) =>
      id !== part &&
      !mounts.has(id) &&
      boxesOf(state, id).some((box) => sweeps.some((sweep) => passesThrough(sweep, box))),
  );

function propellerWords(sweeps: readonly Sweep[], others: readonly Thruster[], room: number): string[] {
  const names = [...new Set(others.map(({ name }) => name))];
  return names.flatMap((name) => {
    const theirs = others.filter((other) => other.name === name).map(sweepOf);
    const gap = leastOf(sweeps, (sweep) =>
      Math.min(...theirs.map((other) => gapToPropeller(sweep, other, room))),
    );
    return gap < room - DUST ? [`The propeller would strike that of ${name}.`] : [];
  });
}

/** Pieces at one and the same place are taken to have been told apart by the builder. */
function fellowWords(sweeps: readonly Sweep[], room: number): string[] {
  const gaps = sweeps.flatMap((sweep, i) =>
    sweeps
      .slice(i + 1)
      .filter(({ at }) => at.some((each, axis) => each !== sweep.at[axis]))
      .map((fellow) => gapToFellow(sweep, fellow)),
  );
  return Math.min(...gaps) < room - DUST ? ['The propellers would strike each other.'] : [];
}

function beyondWords(own: readonly Thruster[], length: number): string[] {
  const station = own[0]!.at[0];
  const beyond = (which: string, by: number) => [
    `It stands ${which}: by ${say(by, 'length')}, on a mount that is not in the sums.`,
  ];
  if (station < -DUST) return beyond('ahead of the nose', -station);
  return station > length + DUST ? beyond('beyond the tail', station - length) : [];
}
