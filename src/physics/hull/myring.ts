/**
 * Myring's hull in Prestero's form with both ends cut back: nose, parallel middle, tail.
 *
 *   nose    r = D/2 [1 − ((x + a_off − a)/a)²]^(1/n)                                0 ≤ x ≤ a − a_off
 *   middle  r = D/2                                                                length b
 *   tail    r = D/2 − [3D/(2c²) − tan θ/c] u² + [D/c³ − tan θ/c²] u³               0 ≤ u ≤ c − c_off
 *
 * x station, u from the start of the tail, θ the half angle at the full tail tip (u = c, where r = 0), all m and rad.
 * Faces left by a_off and c_off count. tan θ may not pass 3D/(2c): beyond that the tail swells past D first.
 * Source: T. Prestero, Verification of a Six-Degree of Freedom Simulation Model for the REMUS AUV, MIT/WHOI 2001,
 * eqs. 2.1–2.2, after D. F. Myring, Aeronautical Quarterly 27 (1976); equations from memory.
 */
import { infeasible, type Outcome, solved } from '../../numeric/outcome.ts';
import { say } from '../../units/sentence.ts';
import { type Meridian, type ShapeOf, type Stretch, straight } from './meridian.ts';

type Myring = ShapeOf<'myring'>;

export function myring(shape: Myring): Outcome<Meridian> {
  const fault = cutFault(shape) ?? tailAngleFault(shape);
  if (fault) return fault;
  const maxRadius = shape.diameter / 2;
  const nose = noseStretch(shape);
  const tail = tailStretch(shape);
  const tailFace = tail.at(1).r;
  return solved({
    stretches: [
      ...(shape.noseOffset > 0 ? [straight(0, nose.at(0).r, 0)] : []),
      nose,
      ...(shape.middleLength > 0 ? [straight(maxRadius, maxRadius, shape.middleLength)] : []),
      tail,
      ...(tailFace > 0 ? [straight(tailFace, 0, 0)] : []),
    ],
    maxRadius,
  });
}

function cutFault({ noseLength, noseOffset, tailLength, tailOffset }: Myring) {
  if (noseOffset >= noseLength)
    return infeasible(
      `The nose offset of ${say(noseOffset, 'length')} leaves nothing of a nose ${say(noseLength, 'length')} long.`,
      `The nose offset must be under ${say(noseLength, 'length')}.`,
    );
  if (tailOffset >= tailLength)
    return infeasible(
      `The tail offset of ${say(tailOffset, 'length')} leaves nothing of a tail ${say(tailLength, 'length')} long.`,
      `The tail offset must be under ${say(tailLength, 'length')}.`,
    );
  return undefined;
}

function tailAngleFault({ tailAngle, tailLength, diameter }: Myring) {
  const greatest = Math.atan((1.5 * diameter) / tailLength);
  if (tailAngle >= 0 && tailAngle <= greatest) return undefined;
  return infeasible(
    `A tail angle of ${say(tailAngle, 'angle')} makes the tail ${tailAngle < 0 ? 'cross the axis' : 'swell past the greatest diameter'}.`,
    `With this diameter and tail length the angle may lie between 0° and ${say(greatest, 'angle')}.`,
  );
}

/**
 * With w = r/(D/2) = sin φ the nose is ξ = −√(1 − sinⁿ φ), smooth at the shoulder (φ = π/2); φ runs as a power of t
 * that also makes the tip smooth for n < 2. expm1 and log1p keep the difference 1 − sinⁿ φ exact near the shoulder.
 */
function noseStretch({ noseLength, noseOffset, nosePower, diameter }: Myring): Stretch {
  const power = Math.max(1, 2 / nosePower);
  const cut = (noseOffset / noseLength) * (2 - noseOffset / noseLength);
  const start = (Math.asin(Math.min(1, cut ** (1 / nosePower))) / (Math.PI / 2)) ** (1 / power);
  return {
    at: (t) => {
      const base = start + (1 - start) * t;
      const phi = (Math.PI / 2) * base ** power;
      const sin = Math.sin(phi);
      const cos = Math.cos(phi);
      const logSin = cos < sin ? Math.log1p(-cos * cos) / 2 : Math.log(sin);
      const xi = Math.sqrt(-Math.expm1(nosePower * logSin));
      const dPhi = (Math.PI / 2) * power * base ** (power - 1) * (1 - start);
      // Both cos φ and ξ vanish at the shoulder; their quotient tends to √(2/n).
      const cosOverXi = xi > 0 ? cos / xi : Math.sqrt(2 / nosePower);
      return {
        r: (diameter / 2) * sin,
        dx: noseLength * (nosePower / 2) * sin ** (nosePower - 1) * cosOverXi * dPhi,
        dr: (diameter / 2) * cos * dPhi,
      };
    },
  };
}

function tailStretch({ tailLength: c, tailOffset, tailAngle, diameter }: Myring): Stretch {
  const length = c - tailOffset;
  const slope = Math.tan(tailAngle) * c;
  return {
    at: (t) => {
      const u = (length / c) * t;
      const left = 1 - u;
      // The cubic divided by its root at the tip: r = (1 − u)[D/2 (1 − u)(1 + 2u) + c tan θ u²].
      const inner = (diameter / 2) * left * (1 + 2 * u) + slope * u * u;
      return {
        r: left * inner,
        dx: length,
        dr: (length / c) * (-3 * diameter * u * left + slope * u * (2 - 3 * u)),
      };
    },
  };
}
