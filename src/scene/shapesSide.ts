/**
 * What each kind of part looks like from the side: plain shapes of our own in metres about the middle of the piece, u
 * aft and z outward, filling its length and its apparent height.
 */
import type { PartKind } from '../craft/schema.ts';
import { box, carried, ellipse, type Path, p, polygon, roundedBox, stroke } from './path.ts';

type Shape = (length: number, height: number) => Path[];

/** Motor can, cone, and the propeller disc edge-on behind it. */
const thruster: Shape = (l, h) => [
  ellipse(0.36 * l, 0, Math.max(0.05 * l, 0.012 * h), h / 2, 'dark'),
  polygon([
    p(-0.5 * l, -0.1 * h),
    p(-0.4 * l, -0.17 * h),
    p(0.22 * l, -0.17 * h),
    p(0.22 * l, 0.17 * h),
    p(-0.4 * l, 0.17 * h),
    p(-0.5 * l, 0.1 * h),
  ]),
  polygon([p(0.28 * l, -0.1 * h), p(0.5 * l, 0), p(0.28 * l, 0.1 * h)]),
  stroke(p(-0.1 * l, -0.17 * h), p(-0.1 * l, 0.17 * h)),
];

const gondola: Shape = (l, h) => [
  roundedBox(l, h, 0.35 * h),
  stroke(p(-0.42 * l, 0.12 * h), p(0.42 * l, 0.12 * h)),
  box(-0.4 * l, -0.14 * l, -0.02 * h, 0.3 * h, 'dark'),
];

const battery: Shape = (l, h) => [
  box(-0.42 * l, 0.5 * l, -h / 2, h / 2),
  box(-0.5 * l, -0.42 * l, -0.2 * h, 0.2 * h, 'dark'),
  stroke(p(-0.25 * l, -h / 2), p(-0.25 * l, h / 2)),
  stroke(p(-0.1 * l, 0), p(0.06 * l, 0)),
  stroke(p(0.22 * l, 0), p(0.38 * l, 0)),
  stroke(p(0.3 * l, -0.2 * h), p(0.3 * l, 0.2 * h)),
];

/** A plate that is on no skin: both halves about the middle. */
const fin: Shape = (l, h) => [
  polygon([
    p(-0.5 * l, 0),
    p(-0.05 * l, 0.5 * h),
    p(0.5 * l, 0.5 * h),
    p(0.5 * l, -0.5 * h),
    p(-0.05 * l, -0.5 * h),
  ]),
  stroke(p(0.26 * l, -0.5 * h), p(0.26 * l, 0.5 * h)),
];

const controller: Shape = (l, h) => [
  box(-0.5 * l, 0.5 * l, -0.3 * h, 0.3 * h),
  ...[-0.36, -0.12, 0.12, 0.36].flatMap((at) => [
    stroke(p(at * l, 0.3 * h), p(at * l, 0.5 * h)),
    stroke(p(at * l, -0.3 * h), p(at * l, -0.5 * h)),
  ]),
  ellipse(-0.3 * l, 0, 0.06 * l, 0.09 * h, 'dark', 12),
];

const servo: Shape = (l, h) => [
  box(-0.36 * l, 0.36 * l, -0.5 * h, 0.28 * h),
  box(-0.5 * l, 0.5 * l, -0.02 * h, 0.1 * h),
  box(-0.26 * l, -0.06 * l, 0.28 * h, 0.4 * h, 'dark'),
  polygon([p(-0.3 * l, 0.4 * h), p(0.3 * l, 0.42 * h), p(0.3 * l, 0.48 * h), p(-0.3 * l, 0.5 * h)]),
];

/** A body with the hood of its lens ahead of it. */
const camera: Shape = (l, h) => [
  polygon(
    [p(-0.5 * l, -0.36 * h), p(-0.25 * l, -0.2 * h), p(-0.25 * l, 0.2 * h), p(-0.5 * l, 0.36 * h)],
    'dark',
  ),
  carried(roundedBox(0.8 * l, h, 0.15 * h), ({ u, z }) => p(u + 0.1 * l, z)),
  ellipse(0.12 * l, 0, 0.2 * l, 0.26 * h),
  ellipse(0.12 * l, 0, 0.08 * l, 0.11 * h, 'dark'),
];

/** A dome on a base. */
const sensor: Shape = (l, h) => [
  polygon([
    ...Array.from({ length: 13 }, (_, i) => {
      const angle = (Math.PI * i) / 12;
      return p(0.4 * l * Math.cos(angle), -0.2 * h + 0.7 * h * Math.sin(angle));
    }),
  ]),
  box(-0.5 * l, 0.5 * l, -0.5 * h, -0.2 * h),
];

/** A parcel with its strap. */
const load: Shape = (l, h) => [
  box(-0.5 * l, 0.5 * l, -0.5 * h, 0.5 * h),
  stroke(p(-0.5 * l, 0.12 * h), p(0.5 * l, 0.12 * h)),
  box(-0.08 * l, 0.08 * l, -0.5 * h, 0.5 * h, 'dark'),
];

/** A weight with its eye. */
const ballast: Shape = (l, h) => [
  ellipse(0, 0.38 * h, 0.12 * l, 0.12 * h, 'line', 14),
  polygon([p(-0.5 * l, -0.5 * h), p(0.5 * l, -0.5 * h), p(0.28 * l, 0.28 * h), p(-0.28 * l, 0.28 * h)]),
];

/** A plate with its corners cut and a hole at its middle. */
const fitting: Shape = (l, h) => {
  const cut = 0.35 * Math.min(l, h);
  const [a, b] = [l / 2, h / 2];
  return [
    polygon([
      p(-a, b - cut),
      p(-a + cut, b),
      p(a - cut, b),
      p(a, b - cut),
      p(a, -b + cut),
      p(a - cut, -b),
      p(-a + cut, -b),
      p(-a, -b + cut),
    ]),
    ellipse(0, 0, 0.18 * Math.min(l, h), 0.18 * Math.min(l, h), 'dark', 14),
  ];
};

export const SIDE_SHAPES: Readonly<Record<PartKind, Shape>> = {
  thruster,
  gondola,
  battery,
  fin,
  controller,
  servo,
  camera,
  sensor,
  load,
  ballast,
  fitting,
};
