import { test } from 'vitest';
import { FLAT_RADIUS, HALF_THICKNESS } from '../../../src/physics/hull/balloonProfile.ts';
import { built } from './built.ts';
import { near } from './near.ts';

const a = 0.45;
const lying = built({ kind: 'roundTwoSheet', flatDiameter: 2 * a, stance: 'lying' });
const standing = built({ kind: 'roundTwoSheet', flatDiameter: 2 * a, stance: 'standing' });

// W. H. Paulsen, Am. Math. Monthly 101 (1994) 953; I. M. Mladenov, On the geometry of the mylar balloon (2004).
test('the published figures for flat radius a: radius 0.762760 a, thickness 0.913893 a, V = 1.218524 a³', () => {
  near(lying.length / 2, 0.76276 * a, 1e-6);
  near(lying.breadth / 2, 0.76276 * a, 1e-6);
  near(lying.height, 0.913893 * a, 1e-6);
  near(lying.volume, 1.218524 * a ** 3, 1e-6);
});

// Closed forms (Mladenov): K(1/√2) = 1.854074677301372 (Abramowitz & Stegun 17.3); a = K R/√2, thickness = πR²/(2a)… ;
// the surface of revolution is π²R².
test('closed forms: rim radius from K(1/√2), thickness, surface', () => {
  const K = 1.854074677301372;
  near(FLAT_RADIUS, K / Math.SQRT2, 1e-14);
  const R = lying.length / 2;
  // Legendre's relation at modulus 1/√2, E = K/2 + π/(4K), gives half the thickness √2 (E − K/2) R.
  near(HALF_THICKNESS, (Math.SQRT2 * Math.PI) / (4 * K), 1e-14);
  near(lying.volume, (Math.PI * a * R * R) / 1.5, 1e-12);
  near(lying.area, (Math.PI * R) ** 2);
  near(lying.filmArea, 2 * Math.PI * a * a);
});

test('the tape keeps the flat length over the middle and runs along the rim at the seam', () => {
  const R = lying.length / 2;
  near(lying.tapeAt(R, 0), a, 1e-12);
  near(lying.tapeAt(2 * R, Math.PI), 2 * a, 1e-12);
  near(lying.tapeAt(R, Math.PI / 2), (Math.PI / 2) * R, 1e-12);
  near(standing.tapeAt(2 * R, 0), Math.PI * R, 1e-12);
  near(standing.tapeAt(2 * R, Math.PI / 2), 2 * a, 1e-12);
  near(lying.seamLength, Math.PI * R);
});

test('standing is lying turned a quarter about the hull axis', () => {
  for (const x of [0.05, 0.3, 0.5])
    for (const clock of [0, 0.4, 1.2, 2.5])
      near(standing.radius(x, clock), lying.radius(x, clock + Math.PI / 2), 1e-9);
  near(standing.height, lying.breadth);
  near(standing.breadth, lying.height);
  near(standing.volumeInertia[1], lying.volumeInertia[2]);
  near(standing.volumeInertia[2], lying.volumeInertia[1]);
  near(standing.skinInertia[1], lying.skinInertia[2]);
  near(standing.seamInertia[1], lying.seamInertia[2]);
  near(lying.planformArea, (Math.PI * lying.length ** 2) / 4);
  near(standing.planformArea, lying.sectionArea(lying.length / 2));
});

test('its outline from the side is a circle when it stands', () => {
  const R = standing.length / 2;
  for (const x of [0.01, 0.2, 0.5]) near(standing.radius(x, 0), Math.sqrt(x * (2 * R - x)), 1e-12);
});

// The film itself: flat rings of radius σ carried to ϱ and height ζ; summed here on a fine table of the profile.
test('inertia of the film from its flat rings', () => {
  const R = lying.length / 2;
  const n = 20_000;
  let [about, across, tape, zeta] = [0, 0, 0, 0];
  for (let i = 0; i < n; i += 1) {
    const phi = ((i + 0.5) * Math.PI) / 2 / n;
    const step = Math.PI / 2 / n;
    const run = (R * step) / Math.sqrt(1 + Math.cos(phi) ** 2);
    const rise = run * Math.cos(phi) ** 2;
    const mass = 2 * 2 * Math.PI * (a - tape - run / 2) * run;
    about += mass * (R * Math.cos(phi)) ** 2;
    across += mass * (zeta + rise / 2) ** 2;
    tape += run;
    zeta += rise;
  }
  near(lying.skinInertia[2], about, 1e-6);
  near(lying.skinInertia[0], about / 2 + across, 1e-6);
});
