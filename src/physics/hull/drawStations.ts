/**
 * Stations at which an outline is drawn: evenly spread over a measure that is half tape distance and half turning of
 * the tangent, so that straight stretches get few and round ends many.
 */
import type { Panel } from './panels.ts';

interface Mark {
  readonly x: number;
  /** Running measure, 0 … 1. */
  readonly measure: number;
}

export function drawStations(panels: readonly Panel[], count: number): number[] {
  const marks = measured(panels);
  const wanted = Math.max(2, Math.round(count));
  const stations = [0];
  let k = 1;
  for (let i = 1; i + 1 < wanted; i += 1) {
    while (marks[k]!.measure < i / (wanted - 1)) k += 1;
    const station = between(marks[k - 1]!, marks[k]!, i / (wanted - 1));
    if (station > stations.at(-1)!) stations.push(station);
  }
  const length = panels.at(-1)!.x1;
  while (stations.at(-1)! >= length) stations.pop();
  return [...stations, length];
}

function between(a: Mark, b: Mark, measure: number): number {
  const share = b.measure > a.measure ? (measure - a.measure) / (b.measure - a.measure) : 1;
  return a.x + share * (b.x - a.x);
}

/** Every node of every panel with its share of tape and of turning so far. */
function measured(panels: readonly Panel[]): Mark[] {
  const points = outline(panels);
  const tape = [0];
  const turn = [0];
  let heading: number | undefined;
  for (let i = 1; i < points.length; i += 1) {
    const dx = points[i]!.x - points[i - 1]!.x;
    const dr = points[i]!.r - points[i - 1]!.r;
    const next = dx === 0 && dr === 0 ? (heading ?? 0) : Math.atan2(dr, dx);
    tape.push(tape.at(-1)! + Math.hypot(dx, dr));
    turn.push(turn.at(-1)! + Math.abs(next - (heading ?? next)));
    heading = next;
  }
  const wholeTurn = turn.at(-1)! || 1;
  return points.map(({ x }, i) => ({ x, measure: (tape[i]! / tape.at(-1)! + turn[i]! / wholeTurn) / 2 }));
}

function outline(panels: readonly Panel[]): { x: number; r: number }[] {
  const points = [{ x: 0, r: 0 }];
  for (const { sample, stretch, to, x1 } of panels) {
    sample.x.forEach((x, i) => {
      points.push({ x, r: sample.r[i]! });
    });
    points.push({ x: x1, r: stretch.at(to).r });
  }
  return points;
}
