/**
 * What can be carried where, over the side view on its station scale. The pointer reads it out and a click asks to hang a load there;
 * with the focus on it arrows move the station and Enter asks.
 */
import {
  type CSSProperties,
  type KeyboardEvent,
  type PointerEvent,
  type ReactNode,
  useRef,
  useState,
} from 'react';
import { Layer, Stage } from 'react-konva/es/ReactKonvaCore.js';
import { layCarry, spotAfter, spotAt } from '../scene/carryPlot.ts';
import type { CurveToDraw } from '../scene/planned.ts';
import { carryWords } from '../scene/planWords.ts';
import { CarryMarks } from './CarryMarks.tsx';
import type { SharedProps } from './props.ts';
import { useSize } from './useSize.ts';

export interface CarryPlotProps extends Pick<SharedProps, 'viewState' | 'palette' | 'units' | 'onCarryAt'> {
  readonly carry: CurveToDraw;
  /** Of the hull, m. */
  readonly length: number;
}

const HEIGHT = 96;
const ROOM = { top: 26, foot: HEIGHT - 10 };

const COLUMN: CSSProperties = { display: 'flex', flexDirection: 'column', width: '100%', height: '100%' };
const REST: CSSProperties = { flex: '1 1 0', minHeight: 0 };

/** The side view under its curve, when there is one to show. */
export function BelowCarry({
  carry,
  children,
  ...rest
}: Omit<CarryPlotProps, 'carry'> & Pick<SharedProps, 'carry'> & { readonly children: ReactNode }) {
  return (
    <div style={COLUMN}>
      {carry && <CarryPlot carry={carry} {...rest} />}
      <div style={REST}>{children}</div>
    </div>
  );
}

export function CarryPlot({ carry, length, viewState, palette, units, onCarryAt }: CarryPlotProps) {
  const frame = useRef<HTMLDivElement>(null);
  const { width } = useSize(frame);
  const [pointed, setPointed] = useState<number | null>(null);
  const [kept, setKept] = useState(Math.floor(carry.points.length / 2));
  const [focused, setFocused] = useState(false);
  const page = layCarry(carry, viewState.view, length, ROOM, units);
  const chosen = Math.min(kept, carry.points.length - 1);
  const index = pointed ?? (focused ? chosen : null);
  const spot = index === null ? undefined : carry.points[index];
  const ask = (at: number | null) => {
    const point = at === null ? undefined : carry.points[at];
    if (point && point.mass !== null) onCarryAt?.(point.station);
  };
  const under = (event: PointerEvent): number | null => {
    const x = event.clientX - frame.current!.getBoundingClientRect().left;
    return spotAt(carry, viewState.view, x);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    const next = spotAfter(event.key, event.shiftKey, chosen, carry.points.length);
    if (event.key === 'Enter') ask(chosen);
    else if (next === null) return;
    else setKept(next);
    setPointed(null);
    event.preventDefault();
    event.stopPropagation();
  };
  const reader = carry.points[chosen];
  const asks = onCarryAt && spot && spot.mass !== null;
  return (
    <div
      ref={frame}
      role="slider"
      tabIndex={0}
      data-testid="carry-plot"
      aria-label="What can be carried where"
      aria-valuemin={0}
      aria-valuemax={length}
      aria-valuenow={reader?.station ?? 0}
      aria-valuetext={reader ? carryWords(reader, units) : 'Nothing worked out yet'}
      style={{ ...PLOT, cursor: asks ? 'pointer' : 'default', borderColor: palette.lineSoft }}
      onPointerMove={(event) => setPointed(under(event))}
      onPointerLeave={() => setPointed(null)}
      onPointerUp={(event) => {
        const at = under(event);
        if (at !== null) setKept(at);
        if (event.button === 0) ask(at);
      }}
      onFocus={(event) => setFocused(event.currentTarget.matches(':focus-visible'))}
      onBlur={() => setFocused(false)}
      onKeyDown={onKeyDown}
    >
      <Stage width={width} height={HEIGHT} listening={false}>
        <Layer listening={false}>
          <CarryMarks
            page={page}
            read={index === null ? null : (page.spots[index] ?? null)}
            words={
              spot ? [carryWords(spot, units), ...(asks ? [pressWords(pointed !== null)] : [])].join(' ') : ''
            }
            width={width}
            palette={palette}
          />
        </Layer>
      </Stage>
    </div>
  );
}

const PLOT: CSSProperties = {
  position: 'relative',
  flex: `0 0 ${HEIGHT}px`,
  overflow: 'hidden',
  borderBottom: '1px solid',
  userSelect: 'none',
};

const pressWords = (pointer: boolean): string =>
  pointer ? 'Click to hang a load here.' : 'Enter hangs a load here.';
