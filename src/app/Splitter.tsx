/**
 * A bar between two panes that sets the size of the one after it. By pointer: drag. By key: arrows, Home and End.
 * Enter or a double click folds the pane away and brings it back.
 */
import { type KeyboardEvent, type PointerEvent, useState } from 'react';

interface SplitterProps {
  readonly label: string;
  /** Which way the bar lies: `vertical` stands between panes left and right. */
  readonly orientation: 'vertical' | 'horizontal';
  /** Size of the pane after the bar, px; 0 when folded. */
  readonly size: number;
  readonly least: number;
  readonly most: number;
  /** The size it has at first, and unfolds to. */
  readonly usual: number;
  readonly onSize: (size: number) => void;
}

const STEP = 24;

export function Splitter({ label, orientation, size, least, most, usual, onSize }: SplitterProps) {
  const [grip, setGrip] = useState<{ at: number; size: number } | null>(null);
  const along = (event: PointerEvent) => (orientation === 'vertical' ? event.clientX : event.clientY);
  const resize = (next: number) => onSize(next < least / 2 ? 0 : Math.min(most, Math.max(least, next)));
  const fold = () => onSize(size ? 0 : usual);
  const sizeFor = (key: string): number | null => {
    const [grow, shrink] =
      orientation === 'vertical' ? ['ArrowLeft', 'ArrowRight'] : ['ArrowUp', 'ArrowDown'];
    if (key === grow) return Math.max(size + STEP, least);
    if (key === shrink) return size <= least ? 0 : Math.max(size - STEP, least);
    if (key === 'Home') return 0;
    return key === 'End' ? most : null;
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const next = sizeFor(event.key);
    if (next === null && event.key !== 'Enter') return;
    event.preventDefault();
    if (next === null) fold();
    else onSize(Math.min(most, next));
  };
  return (
    // biome-ignore lint/a11y/useSemanticElements: an hr cannot be focused, dragged or hold a grip.
    <div
      role="separator"
      tabIndex={0}
      className={`splitter ${orientation}`}
      aria-label={label}
      aria-orientation={orientation}
      aria-valuenow={Math.round(size)}
      aria-valuemin={0}
      aria-valuemax={Math.round(most)}
      onKeyDown={onKeyDown}
      onDoubleClick={fold}
      onPointerDown={(event) => {
        event.currentTarget.setPointerCapture(event.pointerId);
        setGrip({ at: along(event), size });
      }}
      onPointerMove={(event) => grip && resize(grip.size + grip.at - along(event))}
      onPointerUp={() => setGrip(null)}
      onPointerCancel={() => setGrip(null)}
    />
  );
}
