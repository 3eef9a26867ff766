import { expect, test } from 'vitest';
import { inUnits, say } from '../../src/units/sentence.ts';

test('a sentence reads in either system', () => {
  const sentence = `Short by ${say(0.0283495, 'mass')}, ${say(0.0254, 'smallLength')} aft.`;
  expect(inUnits(sentence, 'metric')).toBe('Short by 28.3 g, 25 mm aft.');
  expect(inUnits(sentence, 'imperial')).toBe('Short by 1.00 oz, 1.00 in aft.');
});

test('very small and negative quantities are read too', () => {
  expect(inUnits(say(-1e-9, 'mass'), 'metric')).toBe('0.0 g');
  expect(inUnits(say(-0.0125, 'mass'), 'metric')).toBe('\u221212.5 g');
});

test('the article goes by how the number is read', () => {
  const gust = (speed: number) => inUnits(`a ${say(speed, 'speed')} gust`, 'metric');
  const read = [2.4, 8.2, 11, 18.5, 80, 110, 0.8].map(gust);
  expect(read.filter((each) => each.startsWith('an '))).toEqual([
    'an 8.20 m/s gust',
    'an 11.00 m/s gust',
    'an 18.50 m/s gust',
    'an 80.00 m/s gust',
  ]);
  expect(inUnits(`extra ${say(8, 'speed')}`, 'metric')).toBe('extra 8.00 m/s');
});

test('braces that hold no quantity stay as they are', () => {
  expect(inUnits('a {note} of mine', 'metric')).toBe('a {note} of mine');
});
