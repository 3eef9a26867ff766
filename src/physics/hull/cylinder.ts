/**
 * A cylinder of radius R between two ends of length ℓ each.
 *
 *   ellipsoid  half a spheroid: r = R sin θ, x = ℓ(1 − cos θ)
 *   ogive      tangent ogive: arc of radius ϱ = (R² + ℓ²)/(2R) that meets the cylinder without a corner; needs ℓ ≥ R
 *   cone       r = R x/ℓ
 *   flat       a disc across the end; its length is not used. An ellipsoid or cone of length 0 is the same.
 *
 * Source of the ogive: common practice, no source (elementary geometry of the circle).
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { type Meridian, mirrored, quarterEllipse, type ShapeOf, type Stretch, straight } from './meridian.ts';

type Cylinder = ShapeOf<'cylinder'>;

export function cylinder(shape: Cylinder): Outcome<Meridian> {
  const { diameter, noseEnd, noseLength, middleLength, tailEnd, tailLength } = shape;
  const fault =
    ogiveFault('nose', noseEnd, noseLength, diameter) ?? ogiveFault('tail', tailEnd, tailLength, diameter);
  if (fault) return fault;
  const maxRadius = diameter / 2;
  const middle = middleLength > 0 ? [straight(maxRadius, maxRadius, middleLength)] : [];
  return solved({
    stretches: [
      noseStretch(noseEnd, noseLength, maxRadius),
      ...middle,
      mirrored(noseStretch(tailEnd, tailLength, maxRadius)),
    ],
    maxRadius,
  });
}

function ogiveFault(which: string, end: Cylinder['noseEnd'], length: number, diameter: number) {
  if (end !== 'ogive' || length >= diameter / 2) return undefined;
  return infeasible(
    `The ${which} is an ogive ${say(length, 'length')} long; shorter than half its diameter it would bulge past its own tip.`,
    `Make it at least ${say(diameter / 2, 'length')} long, or take an ellipsoid.`,
  );
}

function noseStretch(end: Cylinder['noseEnd'], length: number, radius: number): Stretch {
  if (end === 'flat' || length === 0) return straight(0, radius, 0);
  if (end === 'cone') return straight(0, radius, length);
  return end === 'ogive' ? ogive(length, radius) : quarterEllipse(length, radius, 'fore');
}

/** Tip to shoulder; φ is the slope of the arc, 2 atan(R/ℓ) at the tip and 0 at the shoulder. */
function ogive(length: number, radius: number): Stretch {
  const arc = (radius * radius + length * length) / (2 * radius);
  const atTip = 2 * Math.atan2(radius, length);
  return {
    at: (t) => {
      const phi = atTip * (1 - t);
      return {
        r: Math.max(0, radius - 2 * arc * Math.sin(phi / 2) ** 2),
        dx: arc * atTip * Math.cos(phi),
        dr: arc * atTip * Math.sin(phi),
      };
    },
  };
}
