import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';

const { conductors } = catalogue;
const conductor = (id: string) => conductors.find((entry) => entry.id === id)!;
const area = (diameter: number) => (Math.PI * diameter ** 2) / 4;
const relative = (found: number, expected: number) => Math.abs(found / expected - 1);

/** Densities kg/m³ and conductivities against 100 % IACS = 0.017241 Ω·mm²/m: ASTM B258/IEC 60028; ASTM B566; aluminium from memory. */
const METALS = [
  { prefix: 'copper', density: 8890, iacs: 1 },
  { prefix: 'clad-10', density: 3320, iacs: 0.629 },
  { prefix: 'clad-15', density: 3630, iacs: 0.644 },
  { prefix: 'aluminium', density: 2703, iacs: 0.61 },
];

test.each(conductors)('$id: diameter is 0.127 mm × 92^((36 − n)/39) (ASTM B258)', ({ gauge, diameter }) => {
  expect(relative(diameter, 0.127e-3 * 92 ** ((36 - gauge) / 39))).toBeLessThan(5e-5);
});

test('diameters agree with the table of ASTM B258, inches (from memory)', () => {
  const inches = {
    20: 0.032,
    22: 0.0253,
    24: 0.0201,
    26: 0.0159,
    28: 0.0126,
    30: 0.01,
    32: 0.008,
    34: 0.0063,
    36: 0.005,
  };
  for (const [gauge, inch] of Object.entries(inches)) {
    expect(Math.abs(conductor(`copper-${gauge}`).diameter / 0.0254 - inch), gauge).toBeLessThan(0.00006);
  }
});

test('copper has the resistances of the wire tables (0.017241 Ω·mm²/m at 20 °C), Ω/km', () => {
  const ohms = { 24: 84.2, 26: 133.9, 28: 212.9, 30: 338.5, 32: 538.3, 36: 1361 };
  for (const [gauge, ohm] of Object.entries(ohms)) {
    expect(relative(conductor(`copper-${gauge}`).resistancePerMetre * 1000, ohm), gauge).toBeLessThan(6e-4);
  }
});

const bare = METALS.flatMap((metal) =>
  conductors.filter(({ id }) => id.startsWith(`${metal.prefix}-`)).map((entry) => ({ ...entry, metal })),
);

test.each(bare)(
  '$id: mass and resistance follow from its section',
  ({ diameter, massPerMetre, resistancePerMetre, metal }) => {
    expect(relative(massPerMetre, metal.density * area(diameter))).toBeLessThan(1e-4);
    expect(relative(resistancePerMetre, 0.017241e-6 / metal.iacs / area(diameter))).toBeLessThan(1e-4);
  },
);

test('every bare conductor was recomputed above', () => {
  expect(bare.map(({ id }) => id).sort()).toEqual(
    conductors
      .filter(({ covering }) => covering === 'bare')
      .map(({ id }) => id)
      .sort(),
  );
});

/** Greatest overall diameter in mils and pounds per 1000 ft: NEMA MW 1000, single film. */
test.each([
  { gauge: 24, mils: 21.7, pounds: 1.2466 },
  { gauge: 28, mils: 14.0, pounds: 0.4933 },
  { gauge: 30, mils: 11.2, pounds: 0.3112 },
  { gauge: 34, mils: 7.2, pounds: 0.1243 },
])('enamelled AWG $gauge has the figures of NEMA MW 1000', ({ gauge, mils, pounds }) => {
  const { overallDiameter, massPerMetre } = conductor(`enamelled-${gauge}`);
  expect(relative(overallDiameter, mils * 25.4e-6)).toBeLessThan(1e-4);
  expect(relative(massPerMetre, (pounds * 0.45359237) / 304.8)).toBeLessThan(1e-4);
});

test('enamel adds a little to bare copper of the same gauge, never takes away', () => {
  for (const { gauge, massPerMetre } of conductors.filter(({ covering }) => covering === 'enamelled')) {
    const excess = massPerMetre / conductor(`copper-${gauge}`).massPerMetre - 1;
    expect(excess).toBeGreaterThan(0);
    expect(excess).toBeLessThan(0.08);
  }
});

const insulated = conductors.filter(({ covering }) => covering === 'insulated');

test.each(insulated)(
  '$id: copper and covering are as its source says, and it says it is an estimate',
  (entry) => {
    const [, wall] = /wall of ([\d.]+) mm \(assumed\)/.exec(entry.source)!;
    const [, density] = /and ([\d.]+) g\/cm³ \(from memory\)/.exec(entry.source)!;
    const overall = entry.diameter + 2e-3 * Number(wall);
    const cover = (area(overall) - area(entry.diameter)) * Number(density) * 1000;
    expect(entry.source).toMatch(/^Computed estimate/);
    expect(relative(entry.overallDiameter, overall)).toBeLessThan(1e-4);
    expect(relative(entry.massPerMetre, 8890 * area(entry.diameter) + cover)).toBeLessThan(1e-4);
  },
);

test('copper-clad aluminium carries roughly twice the power per weight of copper (common practice, no source)', () => {
  const figure = (id: string) => conductor(id).massPerMetre * conductor(id).resistancePerMetre;
  for (const id of ['clad-10-24', 'clad-15-24']) {
    expect(figure('copper-24') / figure(id)).toBeGreaterThan(1.5);
    expect(figure('copper-24') / figure(id)).toBeLessThan(2);
  }
});
