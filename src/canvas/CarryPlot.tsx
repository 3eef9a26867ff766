/**
 * What can be carried where, over the side view on its station scale. The pointer reads it out and a click asks to hang a load there;
 * with the focus on it arrows move the station and Enter asks.
 */
import { type CSSProperties, type ReactNode, useRef } from 'react';
import { Layer, Stage } from 'react-konva/es/ReactKonvaCore.js';
import { layCarry } from '../scene/carryPlot.ts';
import type { CurveToDraw } from '../scene/planned.ts';
import { carryWords } from '../scene/planWords.ts';
import { CarryMarks } from './CarryMarks.tsx';
import type { SharedProps } from './props.ts';
import { useSize } from './useSize.ts';
import { useStationReader } from './useStationReader.ts';

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
  const page = layCarry(carry, viewState.view, length, ROOM, units);
  const { index, chosen, pointing, handlers } = useStationReader(
    frame,
    carry.points,
    viewState.view,
    (at) => {
      const point = carry.points[at];
      if (point && point.mass !== null) onCarryAt?.(point.station);
    },
  );
  const spot = index === null ? undefined : carry.points[index];
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
      {...handlers}
    >
      <Stage width={width} height={HEIGHT} listening={false}>
        <Layer listening={false}>
          <CarryMarks
            page={page}
            read={index === null ? null : (page.spots[index] ?? null)}
            words={spot ? [carryWords(spot, units), ...(asks ? [pressWords(pointing)] : [])].join(' ') : ''}
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
