import { expect, test } from 'vitest';
import { sideFigure } from '../../src/scene/figure.ts';
import { FigureCache } from '../../src/scene/keepSame.ts';
import { joinedPart, looseEnd } from '../../src/scene/wireEnd.ts';
import { craft, geometry, wire } from './fixture.ts';

const of = craft();
const drawn = geometry(of);
const figures = new FigureCache(sideFigure).figures(of, drawn, 0.004);
const power = wire('power');
const middleOf = (id: string) => figures.find(({ part }) => part === id)!.middle;

test('over a part it joins that part, but not the one at its other end', () => {
  expect(joinedPart(power, 'to', figures, middleOf('gondola'), 0.02)).toBe('gondola');
  expect(joinedPart(power, 'to', figures, middleOf('battery'), 0)).not.toBe('battery');
  expect(joinedPart(power, 'to', figures, { u: 2, z: 0.3 }, 0.02)).toBeNull();
});

test('elsewhere a run along the skin ends loose on its meridian, on the hull', () => {
  const end = looseEnd(power, 'to', drawn, { u: 9, z: 1 });
  expect(end).toEqual({ kind: 'loose', place: { kind: 'skin', station: 3, clock: Math.PI, standoff: 0 } });
});

test('a straight run ends where the hand is, as far athwart as it was', () => {
  const straight = wire('power', { path: { kind: 'straight' }, to: { kind: 'part', part: 'camera' } });
  const at = geometry(craft(undefined, [straight]));
  expect(looseEnd(straight, 'to', at, { u: 1.1, z: -0.2 })).toEqual({
    kind: 'loose',
    place: { kind: 'free', x: 1.1, y: 0.1, z: -0.2 },
  });
});
