/** What each kind of part looks like from astern: m about the middle of the piece, u along its width, z outward. */
import type { PartKind } from '../craft/schema.ts';
import { box, ellipse, type Path, p, polygon, roundedBox, stroke } from './path.ts';

type Shape = (width: number, height: number) => Path[];

const plain: Shape = (w, h) => [roundedBox(w, h, 0.15 * Math.min(w, h))];

const thruster: Shape = (w, h) => [
  ellipse(0, 0, w / 2, h / 2, 'dark', 40),
  ellipse(0, 0, 0.17 * w, 0.17 * h),
  stroke(p(-0.5 * w, 0), p(-0.17 * w, 0)),
  stroke(p(0.17 * w, 0), p(0.5 * w, 0)),
];

const gondola: Shape = (w, h) => [
  roundedBox(w, h, 0.35 * Math.min(w, h)),
  stroke(p(-0.4 * w, 0.12 * h), p(0.4 * w, 0.12 * h)),
];

const battery: Shape = (w, h) => [
  box(-w / 2, w / 2, -h / 2, h / 2),
  stroke(p(-0.2 * w, 0), p(0.2 * w, 0)),
  stroke(p(0, -0.2 * h), p(0, 0.2 * h)),
];

const fin: Shape = (w, h) => [box(-w / 2, w / 2, -h / 2, h / 2)];

const camera: Shape = (w, h) => [
  roundedBox(w, h, 0.15 * Math.min(w, h)),
  ellipse(0, 0, 0.3 * Math.min(w, h), 0.3 * Math.min(w, h), 'dark'),
];

const sensor: Shape = (w, h) => [
  ellipse(0, -0.1 * h, 0.4 * w, 0.6 * h),
  box(-w / 2, w / 2, -0.5 * h, -0.2 * h),
];

const load: Shape = (w, h) => [
  box(-w / 2, w / 2, -h / 2, h / 2),
  stroke(p(-w / 2, 0.12 * h), p(w / 2, 0.12 * h)),
];

const ballast: Shape = (w, h) => [
  polygon([p(-0.5 * w, -0.5 * h), p(0.5 * w, -0.5 * h), p(0.28 * w, 0.5 * h), p(-0.28 * w, 0.5 * h)]),
];

const fitting: Shape = (w, h) => [polygon([p(-w / 2, 0), p(0, h / 2), p(w / 2, 0), p(0, -h / 2)])];

export const FRONT_SHAPES: Readonly<Record<PartKind, Shape>> = {
  thruster,
  gondola,
  battery,
  fin,
  controller: plain,
  servo: plain,
  camera,
  sensor,
  load,
  ballast,
  fitting,
};
