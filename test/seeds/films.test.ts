import { expect, test } from 'vitest';
import { catalogue } from '../../src/catalogue/catalogue.ts';

const film = (id: string) => catalogue.films.find((entry) => entry.id === id)!;

test('PET film of 12 µm weighs 16.7 g/m² and breaks near 2.2 kN/m (maker’s data)', () => {
  expect(film('pet-12').arealDensity).toBeCloseTo(0.0167, 4);
  expect(film('pet-12').strength).toBe(2200);
});

test.each(catalogue.films)('$id: areal density and thickness follow from the layers', (entry) => {
  const areal = entry.layers.reduce((sum, { thickness, density }) => sum + thickness * density, 0);
  const thickness = entry.layers.reduce((sum, layer) => sum + layer.thickness, 0);
  expect(Math.abs(entry.arealDensity / areal - 1)).toBeLessThan(5e-5);
  expect(entry.thickness).toBeCloseTo(thickness, 9);
});

test.each(catalogue.films)('$id: the band of areal density is the percentage its source names', (entry) => {
  const percent = Number(/Band of ±(\d+) %: common practice, no source/.exec(entry.source)![1]);
  expect(Math.abs(entry.arealDensityTolerance / ((entry.arealDensity * percent) / 100) - 1)).toBeLessThan(
    0.02,
  );
});

test('every density that is no maker’s figure says that it is from memory', () => {
  for (const { layers, source } of catalogue.films) {
    const materials = new Set(layers.map((layer) => layer.material));
    for (const material of materials) {
      const said = material === 'PET' ? /maker's data/ : /from memory/;
      expect(source, material).toMatch(said);
    }
  }
});

test('strength stands only where a maker’s figure backs it, and grows with thickness', () => {
  const strong = catalogue.films.filter((entry) => entry.strength !== undefined);
  expect(strong.map((entry) => entry.id)).toEqual(
    catalogue.films.filter(({ id }) => /^pet-\d+$/.test(id)).map(({ id }) => id),
  );
  for (const { strength, thickness } of strong) expect(strength! / thickness).toBeCloseTo(2200 / 12e-6, -7);
});
