/** The small craft with everything a ballast plan chooses from, for tests. */
import { type Craft, keyed } from '../../src/craft/craft.ts';
import type { Load } from '../../src/craft/planningSchema.ts';
import { fixtureCraft } from './craftFixture.ts';

export const loadOf = (id: string, change: Partial<Load> = {}): Load => ({
  id,
  name: id,
  mass: 0.04,
  massTolerance: 0.001,
  must: false,
  rank: 1,
  options: [{ kind: 'hardpoint', hardpoint: 'chin' }],
  ...change,
});

export function planningCraft(): Craft {
  const craft = fixtureCraft();
  const { parts, hardpoints } = craft;
  const battery = { ...parts.byId.battery!, slide: { from: 0.4, to: 1.4 } };
  const chin = { ...hardpoints.byId.chin!, fill: 'pieces' as const, limit: 0.2 };
  return {
    ...craft,
    parts: { ...parts, byId: { ...parts.byId, battery } },
    hardpoints: { ...hardpoints, byId: { ...hardpoints.byId, chin } },
    pieces: [
      { mass: 0.01, count: 80 },
      { mass: 0.001, count: 5 },
    ],
    loads: keyed([
      loadOf('logger', {
        options: [
          { kind: 'hardpoint', hardpoint: 'chin' },
          { kind: 'slide', place: { kind: 'keel', station: 1, drop: 0.02 }, from: 0.5, to: 2 },
        ],
      }),
      loadOf('horn', { must: true, options: [{ kind: 'hardpoint', hardpoint: 'nose' }] }),
    ]),
  };
}
