import { expect, test } from 'vitest';
import { DARK, LIGHT, type Palette } from '../../src/scene/palette.ts';

/** Relative luminance and contrast ratio: W3C, WCAG 2.1, definitions of the same names. */
function luminance(colour: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const c = Number.parseInt(colour.slice(at, at + 2), 16) / 255;
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!;
}

function contrast(a: string, b: string): number {
  const [low, high] = [luminance(a), luminance(b)].sort((x, y) => x - y);
  return (high! + 0.05) / (low! + 0.05);
}

const TEXT = ['ink', 'inkSoft', 'brass', 'good', 'bad', 'open', 'lead', 'bob', 'ring', 'thrust'] as const;

test.each([
  ['light', LIGHT],
  ['dark', DARK],
])(
  'every ink that letters are drawn with keeps 4.5 : 1 on paper, panel and gas (%s)',
  (_, palette: Palette) => {
    for (const ink of TEXT) {
      for (const ground of ['paper', 'panel', 'gas'] as const) {
        const ratio = contrast(palette[ink], palette[ground]);
        expect(`${ink} on ${ground}: ${ratio >= 4.5}`).toBe(`${ink} on ${ground}: true`);
      }
    }
  },
);

test.each([
  ['light', LIGHT],
  ['dark', DARK],
])('paper letters on the bars of the beam keep 4.5 : 1 (%s)', (_, palette: Palette) => {
  for (const bar of ['fore', 'aft'] as const)
    expect(contrast(palette.paper, palette[bar])).toBeGreaterThan(4.5);
});
