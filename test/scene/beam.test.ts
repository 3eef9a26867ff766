import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { BeamBar } from '../../src/report/assessment.ts';
import { beamOf, netWords, reachOf } from '../../src/scene/beam.ts';
import { barAt, beamRows, layBeam, zonesOf } from '../../src/scene/beamLayout.ts';
import { isLevel, rowValue } from '../../src/scene/subject.ts';
import { geometry, subject, VIEW } from './fixture.ts';

const bar = (moment: number, i = 0): BeamBar => ({
  kind: 'part',
  id: `p${i}`,
  name: `P${i}`,
  mass: 0.1,
  station: 1.5 + moment / 0.1,
  moment,
});
const moments = fc.array(fc.double({ min: -0.5, max: 0.5, noNaN: true }), { maxLength: 40 });

test('bars of each side lie end to end from the CB, the longest first, and sum to the net moment', () => {
  fc.assert(
    fc.property(moments, (all) => {
      const beam = beamOf(all.map(bar), null);
      for (const side of [beam.bars.filter((b) => b.moment < 0), beam.bars.filter((b) => b.moment >= 0)]) {
        let end = 0;
        let longest = Number.POSITIVE_INFINITY;
        for (const each of side) {
          expect(each.near).toBe(end);
          expect(Math.abs(each.moment)).toBeLessThanOrEqual(longest);
          end = each.far;
          longest = Math.abs(each.moment);
        }
      }
      expect(beam.net).toBeCloseTo(
        all.reduce((sum, m) => sum + m, 0),
        10,
      );
    }),
  );
});

test('the gap closes the shorter side: both sides then reach as far', () => {
  fc.assert(
    fc.property(moments, (all) => {
      const { fore, aft, net, gap } = beamOf(all.map(bar), null);
      expect(Math.abs(gap.far - gap.near)).toBeCloseTo(Math.abs(net), 10);
      expect(Math.abs(gap.far)).toBeCloseTo(Math.max(-fore, aft), 10);
    }),
  );
});

test('of a real craft: the net is solid mass times how far CG lies aft of CB, and the lead fills the gap', () => {
  const { assessment } = subject();
  const { beam: bars, lead, cb } = geometry();
  const beam = beamOf(bars, lead);
  const mass = rowValue(assessment, 'mass.solid')!;
  expect(beam.net).toBeCloseTo(mass * (rowValue(assessment, 'cg.station')! - cb[0]), 9);
  expect(beam.lead!.far).toBeCloseTo(beam.gap.far, 9);
});

test('on the page the beam stands under the CB and stays in sight', () => {
  const { beam: bars, lead, cb } = geometry();
  const beam = beamOf(bars, lead);
  const page = layBeam(beam, { ...VIEW, pivot: cb[0] });
  expect(page.middle).toBe(VIEW.originX + cb[0] * VIEW.scale);
  for (const { left, right } of page.bars) {
    expect(left).toBeGreaterThanOrEqual(0);
    expect(right).toBeLessThanOrEqual(VIEW.width);
  }
  expect(reachOf(beam) * page.scale).toBeLessThan(VIEW.width / 2);
  const longest = page.bars[0]!;
  expect(barAt(page, (longest.left + longest.right) / 2)?.id).toBe(longest.bar.id);
  expect(barAt(page, -500)).toBeNull();
});

test('what is left over, in words: the verdict says whether it matters', () => {
  expect(netWords(0.038, 'metric', false)).toBe('38.00 g·m tail-heavy');
  expect(netWords(-0.0005, 'metric', false)).toBe('0.50 g·m nose-heavy');
  expect(netWords(-0.00027, 'metric', true)).toBe('level within tolerance, 0.27 g·m nose-heavy');
  for (const level of [true, false]) {
    expect(netWords(4.9e-6, 'metric', level)).toBe('balanced');
    expect(netWords(5.1e-6, 'metric', level)).not.toContain('balanced');
  }
});

test('a craft is level when the verdict says so', () => {
  const { assessment } = subject();
  expect(isLevel(assessment)).toBe(assessment.verdicts.find(({ key }) => key === 'level')!.state === 'met');
  const all = [-1, 0, 1].map((margin) => ({
    ...assessment.verdicts[1]!,
    state: margin < 0 ? 'missed' : 'met',
  }));
  expect(all.map((verdict) => isLevel({ verdicts: [verdict as (typeof assessment.verdicts)[0]] }))).toEqual([
    false,
    true,
    true,
  ]);
});

test('every bar answers to the pointer, slivers too', () => {
  fc.assert(
    fc.property(moments, (all) => {
      const page = layBeam(beamOf(all.map(bar), null), VIEW);
      const zones = zonesOf(page);
      expect(zones.map((zone) => zone.bar)).toEqual(page.bars.map((each) => each.bar));
      for (const zone of zones) {
        expect(zone.right - zone.left).toBeGreaterThanOrEqual(4 - 1e-9);
        expect(barAt(page, (zone.left + zone.right) / 2)).toBe(zone.bar);
      }
    }),
  );
});

test('in any pane the result is seen whole, and nothing overlaps', () => {
  fc.assert(
    fc.property(fc.integer({ min: 44, max: 400 }), (height) => {
      const { top, bar, sums, result, leaders } = beamRows(height);
      expect(top).toBeGreaterThanOrEqual(leaders ? 24 : 4);
      expect(bar).toBeGreaterThanOrEqual(14);
      expect(sums - 8).toBeGreaterThan(top + bar);
      if (result !== null) expect(result - sums).toBeGreaterThanOrEqual(16);
      expect((result ?? sums) + 8).toBeLessThanOrEqual(height);
    }),
  );
  expect([60, 80, 90, 120].map((height) => beamRows(height).leaders)).toEqual([false, false, false, true]);
  expect([60, 80, 90, 120].map((height) => beamRows(height).result === null)).toEqual([
    true,
    true,
    false,
    false,
  ]);
});
