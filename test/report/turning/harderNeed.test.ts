import { expect, test } from 'vitest';
import { turnReport } from '../../../src/report/turning/turnReport.ts';
import { pairCraft, tailCraft } from './turningCrafts.ts';

const FULL = { throttle: 1, vector: null, speed: null };

function needOf(turnTime: number | null, sideGust: number | null, craft = tailCraft()) {
  const asking = { ...craft, targets: { ...craft.targets, turnTime, sideGust } };
  return turnReport(asking, FULL, 'metric');
}

test('nothing asked, nothing needed', () => {
  expect(needOf(null, null).need).toBeNull();
});

test('of two targets it is the one that takes more of what is there for it', () => {
  const { rows } = needOf(null, null);
  const [time, gust] = [rows['turn.timeTo90']!.value!, rows['turn.gustHeld']!.value!];
  for (const [turnTime, sideGust, target] of [
    [0.9 * time, 0.5 * gust, 'turnTime'],
    [2 * time, 1.1 * gust, 'sideGust'],
    [null, 0.5 * gust, 'sideGust'],
    [2 * time, null, 'turnTime'],
  ] as const) {
    expect(needOf(turnTime, sideGust).need!.target).toBe(target);
  }
});

test.each([
  ['tail', tailCraft],
  ['pair', pairCraft],
])('%s: more is needed than there is just where the target is missed', (_, craftOf) => {
  const craft = craftOf();
  const { rows } = needOf(null, null, craft);
  const [time, gust] = [rows['turn.timeTo90']!.value!, rows['turn.gustHeld']!.value!];
  for (const share of [0.8, 1.2]) {
    for (const [turnTime, sideGust] of [
      [time / share, null],
      [null, gust * share],
    ] as const) {
      const { need, met } = needOf(turnTime, sideGust, craft);
      expect(need!.needed.value! > need!.there.value!).toBe(!met);
      expect(met).toBe(share < 1);
    }
  }
});
