/** The limits of a plan in words: where each stands, what moving it saves, how far it would have to move. In SI, for `inUnits`. */
import type { Craft } from '../craft/craft.ts';
import type { LoadSlideEnd, Relaxation, SlideEnd } from '../craft/relaxation.ts';
import { say } from '../units/sentence.ts';
import type { Quantity } from '../units/units.ts';

/** What kind of quantity a limit is; null for a load left ashore. */
export const quantityOf = ({ kind }: Relaxation): Quantity => {
  switch (kind) {
    case 'pitchTolerance':
    case 'heelTolerance':
      return 'angle';
    case 'slide':
    case 'loadSlide':
      return 'length';
    case 'pendulumDepth':
      return 'smallLength';
    case 'pieces':
    case 'ashore':
      return 'count';
    default:
      return 'mass';
  }
};

/** A name for JSON and for telling one limit from another: "slide battery from", "pitchTolerance". */
export function limitName(limit: Relaxation): string {
  switch (limit.kind) {
    case 'hardpoint':
      return `hardpoint ${limit.hardpoint}`;
    case 'slide':
      return `slide ${limit.part} ${limit.end}`;
    case 'loadSlide':
      return `slide ${limit.load} ${limit.option} ${limit.end}`;
    case 'pieces':
      return `pieces ${limit.mass}`;
    case 'ashore':
      return `load ${limit.load}`;
    default:
      return limit.kind;
  }
}

/** "Battery’s slide begins at 0.42 m" */
export function limitStands(craft: Craft, limit: Relaxation, now: number): string {
  const value = say(now, quantityOf(limit));
  switch (limit.kind) {
    case 'slide':
    case 'loadSlide':
      return `${sliderName(craft, limit)}’s slide ${limit.end === 'from' ? 'begins' : 'ends'} at ${value}`;
    case 'hardpoint':
      return `the ${spotName(craft, limit.hardpoint)} holds no more than ${value}`;
    case 'pieces':
      return `there are ${value} pieces of ${say(limit.mass, 'mass')}`;
    case 'ashore':
      return `${loadName(craft, limit.load)} has to be carried`;
    case 'pitchTolerance':
      return `it may float no more than ${value} out of level`;
    case 'heelTolerance':
      return `it may heel no more than ${value}`;
    case 'pendulumDepth':
      return `its pendulum has to be ${value} deep`;
    case 'heaviest':
      return now >= 0
        ? `it may be no more than ${value} heavy`
        : `it has to be at least ${say(-now, 'mass')} light`;
    case 'lightest':
      return now <= 0
        ? `it may be no more than ${say(-now, 'mass')} light`
        : `it has to be at least ${value} heavy`;
  }
}

/** "each further 10 mm would save 1.2 g" */
export function stepSaves(limit: Relaxation, step: number, saving: number): string {
  const saved = `would save ${say(saving, 'mass')}`;
  switch (limit.kind) {
    case 'pieces':
      return `one more ${saved}`;
    case 'ashore':
      return `leaving it ashore ${saved} of ballast`;
    case 'pendulumDepth':
      return `each ${say(step, 'smallLength')} less ${saved}`;
    case 'slide':
    case 'loadSlide':
      return `each further ${say(step, 'smallLength')} ${saved}`;
    default:
      return `each further ${say(step, quantityOf(limit))} ${saved}`;
  }
}

/** "let Battery slide to 0.38 m (its slide begins at 0.42 m)". `litres`: volume of hull that lifts one kilogram, m³/kg. */
export function relaxationWords(craft: Craft, limit: Relaxation, now: number, litres: number): string {
  const quantity = quantityOf(limit);
  const to = 'to' in limit ? limit.to : 0;
  const value = say(to, quantity);
  switch (limit.kind) {
    case 'slide':
    case 'loadSlide':
      return `let ${sliderName(craft, limit)} slide to ${value} instead of ${say(now, quantity)}`;
    case 'hardpoint':
      return `let the ${spotName(craft, limit.hardpoint)} hold ${value} instead of ${say(now, quantity)}`;
    case 'pieces':
      return `have ${value} pieces of ${say(limit.mass, 'mass')} instead of ${say(now, quantity)}`;
    case 'ashore':
      return `leave ${loadName(craft, limit.load)} ashore`;
    case 'pitchTolerance':
      return `let it float ${value} out of level instead of ${say(now, quantity)}`;
    case 'heelTolerance':
      return `let it heel ${value} instead of ${say(now, quantity)}`;
    case 'pendulumDepth':
      return `be content with a pendulum ${value} deep instead of ${say(now, quantity)}`;
    case 'heaviest':
      return `have ${say(to - now, 'mass')} more lift (${say((to - now) * litres, 'volume')} of hull), save that much at the CB, or let it be ${heaviness(to)}`;
    case 'lightest':
      return `let it be ${heaviness(to)} instead of ${heaviness(now)}`;
  }
}

const heaviness = (mass: number): string => `${say(Math.abs(mass), 'mass')} ${mass >= 0 ? 'heavy' : 'light'}`;

const sliderName = (craft: Craft, limit: SlideEnd | LoadSlideEnd): string =>
  limit.kind === 'slide' ? partName(craft, limit.part) : loadName(craft, limit.load);

export const partName = ({ parts }: Craft, id: string): string => {
  const part = parts.byId[id];
  return part?.name || part?.kind || id;
};

export const loadName = ({ loads }: Craft, id: string): string => loads.byId[id]?.name || id;

export const spotName = ({ hardpoints }: Craft, id: string): string =>
  (hardpoints.byId[id]?.name || 'hardpoint').toLowerCase();
