/** The palette on the page: every colour as a CSS custom property, following the system unless told otherwise. */
import { useEffect, useState } from 'react';
import { DARK, LIGHT, type Palette } from '../scene/palette.ts';
import type { Theme } from './settings.ts';

const DARK_QUERY = '(prefers-color-scheme: dark)';

export const isDark = (theme: Theme, systemDark: boolean): boolean =>
  theme === 'system' ? systemDark : theme === 'dark';

/** `inkSoft` → `--ink-soft`. */
export const propertyName = (colour: string): string =>
  `--${colour.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)}`;

export function writePalette(palette: Palette, dark: boolean, root: HTMLElement): void {
  for (const [colour, value] of Object.entries(palette)) root.style.setProperty(propertyName(colour), value);
  root.style.colorScheme = dark ? 'dark' : 'light';
}

/** The palette for the chosen theme, written to the page as well. */
export function usePalette(theme: Theme): Palette {
  const systemDark = useSystemDark();
  const dark = isDark(theme, systemDark);
  const palette = dark ? DARK : LIGHT;
  useEffect(() => writePalette(palette, dark, document.documentElement), [palette, dark]);
  return palette;
}

function useSystemDark(): boolean {
  const [dark, setDark] = useState(() => matchMedia(DARK_QUERY).matches);
  useEffect(() => {
    const query = matchMedia(DARK_QUERY);
    const follow = () => setDark(query.matches);
    query.addEventListener('change', follow);
    return () => query.removeEventListener('change', follow);
  }, []);
  return dark;
}
