import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { BeamBar } from '../../src/report/assessment.ts';
import { beamOf, netWords, reachOf } from '../../src/scene/beam.ts';
import { barAt, layBeam } from '../../src/scene/beamLayout.ts';
import { rowValue } from '../../src/scene/subject.ts';
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

test('what is left over, in words', () => {
  expect(netWords(0.038, 'metric')).toBe('38.00 g·m tail-heavy');
  expect(netWords(-0.0005, 'metric')).toBe('0.50 g·m nose-heavy');
  expect(netWords(1e-9, 'metric')).toBe('in balance');
});
