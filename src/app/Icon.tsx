/** Small drawn signs for buttons; always beside a word or an accessible name. */
const PATHS = {
  new: 'M8 3v10M3 8h10',
  crafts: 'M2 6c0-2 2.7-3 6-3s6 1 6 3-2.7 3-6 3-6-1-6-3zM4 12h8',
  open: 'M2 12V4h4l1.5 2H14v6zM8 12',
  save: 'M8 2v8M5 7l3 3 3-3M3 13h10',
  undo: 'M6 3 3 6l3 3M3 6h6a4 4 0 0 1 0 8H6',
  redo: 'M10 3l3 3-3 3M13 6H7a4 4 0 0 0 0 8h3',
  tilt: 'M2 11 14 5M4 8l-2 3 3.5.5',
  fit: 'M2 5V2h3M11 2h3v3M14 11v3h-3M5 14H2v-3',
  several: 'M2 2h7v7H2zM11.5 8v6M8.5 11h6',
  snap: 'M3 2h3v6a2 2 0 0 0 4 0V2h3v6a5 5 0 0 1-10 0zM3 5h3M10 5h3',
  units: 'M2 6h12v5H2zM5 6v2M8 6v3M11 6v2',
  theme: 'M8 3a5 5 0 1 0 5 6 4 4 0 0 1-5-6z',
  keys: 'M2 5h12v7H2zM4.5 7.5h.1M8 7.5h.1M11.5 7.5h.1M5 10h6',
  close: 'M4 4l8 8M12 4l-8 8',
} as const;

export type IconName = keyof typeof PATHS;

export const Icon = ({ name }: { name: IconName }) => (
  <svg className="icon" viewBox="0 0 16 16" aria-hidden="true" focusable="false">
    <path d={PATHS[name]} />
  </svg>
);
