/**
 * A sentence on what is wrong in a cell, floating under it, or over it where there is no room below. It stands in the
 * browser's top layer, so that no pane that scrolls cuts it off.
 */
import { useLayoutEffect, useRef } from 'react';

const GAP = 3;
const EDGE = 8;

export function ErrorBubble({ id, children }: { id: string; children: string }) {
  const ref = useRef<HTMLSpanElement>(null);
  useLayoutEffect(() => {
    const bubble = ref.current!;
    bubble.showPopover();
    const follow = () => placeBeside(bubble, bubble.parentElement!.getBoundingClientRect());
    follow();
    const stop = new AbortController();
    addEventListener('scroll', follow, { capture: true, passive: true, signal: stop.signal });
    addEventListener('resize', follow, { signal: stop.signal });
    return () => stop.abort();
  }, []);
  return (
    <span ref={ref} className="field-error error-bubble" id={id} role="alert" popover="manual">
      {children}
    </span>
  );
}

function placeBeside(bubble: HTMLElement, cell: DOMRect): void {
  const { width, height } = bubble.getBoundingClientRect();
  const below = cell.bottom + GAP;
  const top = below + height > innerHeight - EDGE ? cell.top - GAP - height : below;
  const left = Math.max(EDGE, Math.min(cell.left, innerWidth - EDGE - width));
  Object.assign(bubble.style, { top: `${top}px`, left: `${left}px` });
}
