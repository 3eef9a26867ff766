/**
 * A rival for every hull figure: a closed mesh of triangles laid over the hull through radius() alone, summed as
 * tetrahedra from the origin. Facets lie inside a round hull by O(1/n²), so two meshes are extrapolated (Richardson).
 */
import type { Hull } from '../../../src/physics/hull/hull.ts';

type Vec = readonly [number, number, number];

export interface MeshSums {
  volume: number;
  area: number;
  /** ∫x dV and ∫x dA. */
  volumeX: number;
  areaX: number;
  /** ∫x² dV, ∫y² dV, ∫z² dV. */
  volumeXX: number;
  volumeYY: number;
  volumeZZ: number;
}

export function extrapolatedSums(hull: Hull, stations: number, clocks: number): MeshSums {
  const coarse = meshSums(hull, stations, clocks);
  const fine = meshSums(hull, 2 * stations, 2 * clocks);
  const sums = { ...fine };
  for (const key of Object.keys(sums) as (keyof MeshSums)[]) sums[key] = (4 * fine[key] - coarse[key]) / 3;
  return sums;
}

function meshSums(hull: Hull, stations: number, clocks: number): MeshSums {
  const sums = { volume: 0, area: 0, volumeX: 0, areaX: 0, volumeXX: 0, volumeYY: 0, volumeZZ: 0 };
  const rings = Array.from({ length: stations + 1 }, (_, i) =>
    ring(hull, (hull.length / 2) * (1 - Math.cos((Math.PI * i) / stations)), clocks),
  );
  const nose: Vec = [0, 0, 0];
  const tail: Vec = [hull.length, 0, 0];
  for (let k = 0; k < clocks; k += 1) {
    const next = (k + 1) % clocks;
    addTriangle(sums, nose, rings[0]![k]!, rings[0]![next]!);
    addTriangle(sums, tail, rings[stations]![next]!, rings[stations]![k]!);
    for (let i = 0; i < stations; i += 1) {
      const [a, b, c, d] = [rings[i]![k]!, rings[i]![next]!, rings[i + 1]![next]!, rings[i + 1]![k]!];
      addTriangle(sums, a, c, b);
      addTriangle(sums, a, d, c);
    }
  }
  return sums;
}

function ring(hull: Hull, station: number, clocks: number): Vec[] {
  return Array.from({ length: clocks }, (_, k) => {
    const clock = (2 * Math.PI * k) / clocks;
    const r = hull.radius(station, clock);
    return [station, r * Math.sin(clock), r * Math.cos(clock)];
  });
}

/** One triangle, anticlockwise seen from outside: its tetrahedron with the origin, and its own area. */
function addTriangle(sums: MeshSums, a: Vec, b: Vec, c: Vec): void {
  const volume = dot(a, cross(b, c)) / 6;
  const area = length(cross(minus(b, a), minus(c, a))) / 2;
  sums.volume += volume;
  sums.area += area;
  sums.volumeX += (volume * (a[0] + b[0] + c[0])) / 4;
  sums.areaX += (area * (a[0] + b[0] + c[0])) / 3;
  sums.volumeXX += volume * secondMoment(a[0], b[0], c[0]);
  sums.volumeYY += volume * secondMoment(a[1], b[1], c[1]);
  sums.volumeZZ += volume * secondMoment(a[2], b[2], c[2]);
}

/** Mean of the square of a coordinate over a tetrahedron with one corner at 0. */
const secondMoment = (p: number, q: number, r: number): number =>
  (p * p + q * q + r * r + p * q + q * r + r * p) / 10;

const minus = (a: Vec, b: Vec): Vec => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const dot = (a: Vec, b: Vec): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const length = (a: Vec): number => Math.sqrt(dot(a, a));
const cross = (a: Vec, b: Vec): Vec => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
