/** The element around a canvas: it takes the focus, names itself to a screen reader, and holds the pointer. */
import { type CSSProperties, type MouseEvent, type ReactNode, type RefObject, useId } from 'react';
import type { View } from '../scene/view.ts';
import type { KeyHandlers } from './keys.ts';
import type { GestureHandlers } from './useGestures.ts';

export interface FrameProps {
  readonly frame: RefObject<HTMLDivElement | null>;
  readonly testId: string;
  readonly label: string;
  /** The drawing in words, and its keys. */
  readonly description: string;
  /** What changed last, said once. */
  readonly status: string;
  readonly view: View;
  readonly cursor: string;
  readonly handlers: GestureHandlers & KeyHandlers & { onDoubleClick?(event: MouseEvent): void };
  readonly leave?: () => void;
  readonly children: ReactNode;
}

const FILL: CSSProperties = {
  position: 'relative',
  width: '100%',
  height: '100%',
  minWidth: 0,
  minHeight: 0,
  overflow: 'hidden',
  touchAction: 'none',
  userSelect: 'none',
  // The ring of the focus is drawn inside the edge and over the canvases.
  outlineOffset: -3,
  isolation: 'isolate',
};

const UNSEEN: CSSProperties = {
  position: 'absolute',
  width: 1,
  height: 1,
  overflow: 'hidden',
  clipPath: 'inset(50%)',
  whiteSpace: 'nowrap',
};

export function Frame(props: FrameProps) {
  const { frame, testId, label, description, status, view, cursor, handlers, leave, children } = props;
  const described = useId();
  return (
    <div
      ref={frame}
      role="application"
      // biome-ignore lint/a11y/noNoninteractiveTabindex: the drawing takes the arrow keys
      tabIndex={0}
      aria-label={label}
      aria-describedby={described}
      data-testid={testId}
      data-scale={view.scale}
      data-origin-x={view.originX}
      data-origin-y={view.originY}
      data-tilt={view.tilt}
      data-pivot={view.pivot}
      style={{ ...FILL, cursor }}
      onPointerLeave={leave}
      {...handlers}
    >
      <div aria-hidden="true" style={{ position: 'absolute', inset: 0, zIndex: -1 }}>
        {children}
      </div>
      <p id={described} style={UNSEEN}>
        {description}
      </p>
      <p role="status" style={UNSEEN}>
        {status}
      </p>
    </div>
  );
}
