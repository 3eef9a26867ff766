/**
 * Stations at which an outline is drawn: evenly spread over a measure that is half tape distance and half turning of
 * the tangent, so that straight stretches get few and round ends many; and every corner.
 */
import type { Panel } from './panels.ts';

interface Mark {
  readonly x: number;
  readonly r: number;
}

/** A turn between neighbouring marks beyond this is drawn as a corner, rad. */
const CORNER = 0.15;

/** Ascending, from 0 to the length, about `count` of them. */
export function drawStations(panels: readonly Panel[], count: number): number[] {
  const marks = outline(panels);
  const turns = turnsAt(marks);
  const measure = measured(marks, turns);
  const corners = marks.filter((_, i) => turns[i]! > CORNER).map(({ x }) => x);
  const spread = Array.from({ length: Math.max(0, Math.round(count) - 2) }, (_, i) =>
    placeOf(marks, measure, (i + 1) / (Math.round(count) - 1)),
  );
  const length = panels.at(-1)!.x1;
  const inside = [...spread, ...corners].filter((x) => x > 0 && x < length);
  return [...new Set([0, ...inside.sort((a, b) => a - b), length])];
}

/** Every node of every panel, and the ends of the panels. */
function outline(panels: readonly Panel[]): Mark[] {
  const marks = [{ x: 0, r: 0 }];
  for (const { sample, stretch, from, to, x0, x1 } of panels) {
    marks.push({ x: x0, r: stretch.at(from).r });
    sample.x.forEach((x, i) => {
      marks.push({ x, r: sample.r[i]! });
    });
    marks.push({ x: x1, r: stretch.at(to).r });
  }
  return marks.filter(({ x, r }, i) => i === 0 || x !== marks[i - 1]!.x || r !== marks[i - 1]!.r);
}

/** How far the outline turns at each mark, rad. */
function turnsAt(marks: readonly Mark[]): number[] {
  const headings = marks.slice(1).map(({ x, r }, i) => Math.atan2(r - marks[i]!.r, x - marks[i]!.x));
  return marks.map((_, i) => (i > 0 && i < headings.length ? Math.abs(headings[i]! - headings[i - 1]!) : 0));
}

/** Share of tape and of turning from the nose to each mark, 0 … 1. */
function measured(marks: readonly Mark[], turns: readonly number[]): number[] {
  let tape = 0;
  let turn = 0;
  const wholeTurn = turns.reduce((sum, angle) => sum + angle, 0) || 1;
  const sums = marks.map(({ x, r }, i) => {
    if (i > 0) tape += Math.hypot(x - marks[i - 1]!.x, r - marks[i - 1]!.r);
    turn += turns[i]! / wholeTurn;
    return { tape, turn };
  });
  return sums.map((sum) => (sum.tape / tape + sum.turn) / 2);
}

function placeOf(marks: readonly Mark[], measure: readonly number[], wanted: number): number {
  let k = 1;
  while (k + 1 < marks.length && measure[k]! < wanted) k += 1;
  const step = measure[k]! - measure[k - 1]!;
  const share = step > 0 ? Math.min(1, Math.max(0, (wanted - measure[k - 1]!) / step)) : 1;
  return marks[k - 1]!.x + share * (marks[k]!.x - marks[k - 1]!.x);
}
