import { expect, test } from 'vitest';
import { solved } from '../../../src/numeric/outcome.ts';
import { craftStateOf } from '../../../src/physics/craftState.ts';
import { type Climb, type ClimbPoint, climbCurve } from '../../../src/physics/cruise/climb.ts';
import { climbPieces } from '../../../src/report/turning/climbPieces.ts';
import { CLIMB_POINTS } from '../../../src/report/turning/pitchRows.ts';
import { turnReport } from '../../../src/report/turning/turnReport.ts';
import { sampleCraft } from '../../samples/readSamples.ts';

const point = (vector: number, climbRate: number, attack = 0): ClimbPoint => ({
  vector,
  climb: solved({ climbRate, attack } as Climb),
});
const none = (vector: number): ClimbPoint => ({
  vector,
  climb: { status: 'infeasible', why: '', remedy: '' },
});

test('broken where there is no path and where the air comes from another side; a lone point is not drawn', () => {
  const curve = [
    point(0, 0),
    point(1, 0.2),
    none(2),
    point(3, 1),
    point(4, 2),
    point(5, 3, -1.6),
    point(6, 4, -1.6),
    none(7),
    point(8, 9),
  ];
  expect(climbPieces(curve, {}).map((piece) => piece.map(({ x }) => x))).toEqual([
    [0, 1],
    [3, 4],
    [5, 6],
  ]);
});

test('vault-inspector: fastest climb and descent are the ends of what is drawn, and no line crosses a gap', () => {
  const craft = sampleCraft('vault-inspector');
  const state = craftStateOf(craft);
  if (state.status !== 'solved') throw new Error(state.why);
  const curve = climbCurve(state.value, 1, CLIMB_POINTS);
  const { rows } = turnReport(craft, { throttle: 1, vector: null, speed: null }, 'metric');
  const pieces = climbPieces(curve, rows);
  const rates = pieces.flat().map(({ y }) => y);
  expect(Math.max(...rates)).toBe(rows['climb.best']!.value);
  expect(Math.min(...rates)).toBe(rows['climb.descent']!.value);
  const gaps = curve.filter(({ climb }) => climb.status === 'infeasible').map(({ vector }) => vector);
  expect(gaps.length).toBeGreaterThan(0);
  for (const piece of pieces)
    for (const gap of gaps) expect(gap > piece[0]!.x && gap < piece.at(-1)!.x).toBe(false);
});
