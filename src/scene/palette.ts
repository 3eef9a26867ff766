/**
 * The colours, for canvas and page alike: the page writes each as a CSS custom property of the same name
 * (`ink` → `--ink`). Text on `paper` and `panel` keeps a contrast of 4.5 : 1 or better.
 */
export interface Palette {
  readonly paper: string;
  readonly panel: string;
  readonly raised: string;
  readonly ink: string;
  readonly inkSoft: string;
  readonly line: string;
  readonly lineSoft: string;
  /** Selection, focus and what can be grabbed. */
  readonly brass: string;
  readonly brassSoft: string;
  readonly onBrass: string;
  /** Verdicts; each always stands with a word. */
  readonly good: string;
  readonly goodSoft: string;
  readonly bad: string;
  readonly badSoft: string;
  readonly open: string;
  readonly openSoft: string;
  /** The drawing. */
  readonly gas: string;
  readonly skin: string;
  readonly part: string;
  readonly partEdge: string;
  readonly wire: string;
  readonly lead: string;
  readonly bob: string;
  readonly ring: string;
  /** Thrust, and what it does. */
  readonly thrust: string;
  /** Moments forward and aft of the CB. */
  readonly fore: string;
  readonly aft: string;
}

export const LIGHT: Palette = {
  paper: '#f6f4ee',
  panel: '#fffdf8',
  raised: '#ffffff',
  ink: '#23282d',
  inkSoft: '#5a626a',
  line: '#cfc9bb',
  lineSoft: '#e6e1d5',
  brass: '#8a5a00',
  brassSoft: '#f6e6c4',
  onBrass: '#ffffff',
  good: '#1f6b45',
  goodSoft: '#dcefe3',
  bad: '#a3311f',
  badSoft: '#f8e0da',
  open: '#5a5f86',
  openSoft: '#e5e6f1',
  gas: '#e9eef0',
  skin: '#6f7c86',
  part: '#c9cfd2',
  partEdge: '#3c454c',
  wire: '#7a5c99',
  lead: '#454a66',
  bob: '#8a3b12',
  ring: '#0f5e73',
  thrust: '#1f4fae',
  fore: '#34728a',
  aft: '#a9552c',
};

export const DARK: Palette = {
  paper: '#16191c',
  panel: '#1d2125',
  raised: '#262b30',
  ink: '#ece8df',
  inkSoft: '#a9aeb2',
  line: '#3d444a',
  lineSoft: '#2b3035',
  brass: '#e3b55b',
  brassSoft: '#43361b',
  onBrass: '#1b1508',
  good: '#7fd0a0',
  goodSoft: '#1e3a2b',
  bad: '#f09a86',
  badSoft: '#472620',
  open: '#b3b8e6',
  openSoft: '#2d2f4a',
  gas: '#22303a',
  skin: '#8fa0ac',
  part: '#4a545b',
  partEdge: '#cdd4d8',
  wire: '#bb9fe0',
  lead: '#a9b0d8',
  bob: '#f0a36f',
  ring: '#6cc6dd',
  thrust: '#8fb6ff',
  fore: '#6cb2c8',
  aft: '#dd8f63',
};
