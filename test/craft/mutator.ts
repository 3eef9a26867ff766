/** Seeded damage to craft files: the same seed always does the same. */
export type Random = () => number;

/** mulberry32, from memory: 32 bits of state, even enough for choosing damage. */
export function seeded(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const pick = <T>(random: Random, from: readonly T[]): T => from[Math.floor(random() * from.length)]!;

type Node = Record<string, unknown> | unknown[];
interface Spot {
  readonly holder: Node;
  readonly key: string | number;
}

const isNode = (value: unknown): value is Node => value !== null && typeof value === 'object';
const get = ({ holder, key }: Spot): unknown => (holder as Record<string | number, unknown>)[key];
const set = ({ holder, key }: Spot, value: unknown): void => {
  (holder as Record<string | number, unknown>)[key] = value;
};

function spotsOf(node: Node): Spot[] {
  const keys = Array.isArray(node) ? node.map((_, i) => i) : Object.keys(node);
  return keys.flatMap((key) => {
    const spot = { holder: node, key };
    const value = get(spot);
    return isNode(value) ? [spot, ...spotsOf(value)] : [spot];
  });
}

const numbersOf = (file: Node): Spot[] => spotsOf(file).filter((spot) => typeof get(spot) === 'number');

/** Values at the edges of what fields allow, and past them. */
const NUMBERS: readonly unknown[] = [
  0,
  -0,
  1,
  -1,
  2,
  3,
  64,
  0.01,
  0.05,
  0.5,
  50,
  -50,
  1000,
  -1000,
  1e-9,
  5e-324,
  1e-300,
  1e300,
  -1e308,
  1.7976931348623157e308,
  Math.PI,
  2 ** 53,
  200,
  350,
  120_000,
  20_000,
  -500,
];
const OTHERS: readonly unknown[] = [
  null,
  true,
  false,
  '',
  'nose',
  '7',
  [],
  {},
  [[]],
  { kind: 'spheroid' },
  { kind: 'axis', station: 1 },
];
const STRANGE_KEYS = ['__proto__', 'constructor', 'toString', '', 'x', 'kind', 'NaN'];

type Damage = (random: Random, file: Node) => void;

const onSpot =
  (change: (random: Random, spot: Spot) => void): Damage =>
  (random, file) => {
    const spots = spotsOf(file);
    if (spots.length > 0) change(random, pick(random, spots));
  };

const onNumber =
  (change: (random: Random, value: number) => unknown): Damage =>
  (random, file) => {
    const spots = numbersOf(file);
    if (spots.length === 0) return;
    const spot = pick(random, spots);
    set(spot, change(random, get(spot) as number));
  };

const scaled = onNumber((random, value) => value * pick(random, [-1, 0, 0.5, 0.9, 1.1, 2, 10]));
const extreme = onNumber((random) => pick(random, NUMBERS));
const swapped = onSpot((random, spot) => set(spot, pick(random, random() < 0.5 ? OTHERS : NUMBERS)));

const removed = onSpot((_, { holder, key }) => {
  if (Array.isArray(holder)) holder.splice(Number(key), 1);
  else delete holder[key];
});

const doubled = onSpot((_, { holder, key }) => {
  if (Array.isArray(holder)) holder.push(structuredClone(holder[Number(key)]));
});

const added = onSpot((random, { holder }) => {
  if (Array.isArray(holder)) holder.push(pick(random, OTHERS));
  else
    Object.defineProperty(holder, pick(random, STRANGE_KEYS), {
      value: 1,
      enumerable: true,
      configurable: true,
      writable: true,
    });
});

/** Two values of the same file change places: right types in wrong fields, or right fields in a wrong order. */
const exchanged: Damage = (random, file) => {
  const spots = spotsOf(file);
  if (spots.length === 0) return;
  const [a, b] = [pick(random, spots), pick(random, spots)];
  const [first, second] = [structuredClone(get(a)), structuredClone(get(b))];
  set(a, second);
  set(b, first);
};

/** Weighted towards damage that still passes the gate, so that the physics meets it too. */
const DAMAGES: readonly Damage[] = [
  scaled,
  scaled,
  scaled,
  extreme,
  extreme,
  extreme,
  swapped,
  removed,
  doubled,
  added,
  exchanged,
];

function damagedText(random: Random, text: string): string {
  const at = Math.floor(random() * text.length);
  switch (Math.floor(random() * 4)) {
    case 0:
      return text.slice(0, at);
    case 1:
      return (
        text.slice(0, at) +
        String.fromCharCode(text.charCodeAt(at) ^ (1 << Math.floor(random() * 8))) +
        text.slice(at + 1)
      );
    case 2:
      return (
        text.slice(0, at) +
        pick(random, ['1e999', '-1e999', 'NaN', '"', '{', ']', ',', '9', '\u0000', '-']) +
        text.slice(at)
      );
    default:
      return text.replace(/\d+(\.\d+)?/g, (number) =>
        random() < 0.01 ? pick(random, ['1e999', '-1e999', '1e-400', '0']) : number,
      );
  }
}

/** The JSON of a craft file with one to four damages. */
export function damagedJson(random: Random, text: string): unknown {
  const file: Node = JSON.parse(text);
  const times = 1 + Math.floor(random() ** 2 * 4);
  for (let i = 0; i < times; i++) pick(random, DAMAGES)(random, file);
  return file;
}

/** The text of a craft file, damaged as JSON or as text. */
export const damaged = (random: Random, text: string): string =>
  random() < 0.8 ? JSON.stringify(damagedJson(random, text)) : damagedText(random, text);

/** The craft file with one to eight numbers at extremes, each kept only if the file still passes the gate. */
export function stretched(random: Random, text: string, passes: (text: string) => boolean): string {
  const file: Node = JSON.parse(text);
  const spots = numbersOf(file);
  const times = 1 + Math.floor(random() * 8);
  for (let i = 0; i < times; i++) {
    const spot = pick(random, spots);
    const before = get(spot);
    set(spot, random() < 0.7 ? pick(random, NUMBERS) : (before as number) * 3 * random());
    if (!passes(JSON.stringify(file))) set(spot, before);
  }
  return JSON.stringify(file);
}
