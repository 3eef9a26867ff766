/**
 * A placement study under the side view on its station scale, in place of the beam. The pointer reads out a station and a click
 * asks to move the thruster there; with the focus on it arrows move the station and Enter asks. A tap only reads: a button asks.
 */
import { type CSSProperties, useRef } from 'react';
import { Layer, Stage } from 'react-konva/es/ReactKonvaCore.js';
import type { Palette } from '../scene/palette.ts';
import { layPlace, namesAt, type StudySpot, type StudyToDraw } from '../scene/placePlot.ts';
import { curveWords, headWords, stationSentence } from '../scene/placeWords.ts';
import type { UnitSystem } from '../scene/subject.ts';
import { PlaceHead, PlaceMarks, widestName } from './PlaceMarks.tsx';
import { useSize } from './useSize.ts';
import { useStationReader } from './useStationReader.ts';
import type { ViewState } from './useView.ts';

export interface PlacePlotProps {
  readonly study: StudyToDraw;
  /** Whether it was worked out for the craft as it is now. */
  readonly fresh: boolean;
  /** A station that something else on the page points at, m. */
  readonly marked: number | null;
  /** Of the thruster. */
  readonly name: string;
  /** Of the hull, m. */
  readonly length: number;
  readonly viewState: ViewState;
  readonly palette: Palette;
  readonly units: UnitSystem;
  /** Asked to move the thruster to a station, m. */
  onMoveTo(station: number): void;
}

/** Line of words above the strips, and room below them. */
const HEAD = 22;
const FOOT = 6;
/** Of a study that is no longer of this craft. */
const FADED = 0.45;

const OLD = 'Worked out before the last change: try every station again.';

export function PlacePlot({ study, fresh, marked, name, length, units, palette, ...rest }: PlacePlotProps) {
  const frame = useRef<HTMLDivElement>(null);
  const size = useSize(frame);
  const { view } = rest.viewState;
  const ask = (at: number) => {
    const point = study.points[at];
    if (fresh && point) rest.onMoveTo(point.station);
  };
  const reading = useStationReader(frame, study.points, view, ask, true);
  const { index, chosen, pointing, tapped, handlers } = reading;
  const room = { top: HEAD, foot: Math.max(HEAD + 1, size.height - FOOT) };
  const page = layPlace(study, view, length, room, units, namesAt(study, view, widestName()));
  const at = index ?? (marked === null ? -1 : study.points.findIndex(({ station }) => station === marked));
  const spot = study.points[at];
  const reader = study.points[chosen];
  const movable = fresh && index !== null && spot !== undefined && !spot.strikes;
  const press = !movable || tapped ? '' : pointing ? CLICK : ENTER;
  const button = movable && tapped;
  return (
    <div style={PLOT}>
      <div
        ref={frame}
        role="slider"
        tabIndex={0}
        data-testid="place-plot"
        data-tried={study.points.length}
        aria-label={`Stations tried for ${name}`}
        aria-valuemin={Math.min(0, study.points[0]?.station ?? 0)}
        aria-valuemax={Math.max(length, study.points.at(-1)?.station ?? 0)}
        aria-valuenow={reader?.station ?? 0}
        aria-valuetext={reader ? readOut(reader, fresh, units) : 'Nothing worked out yet'}
        style={{ ...PLOT, cursor: movable && pointing ? 'pointer' : 'default' }}
        {...handlers}
      >
        <Stage width={size.width} height={size.height} listening={false}>
          <Layer listening={false} opacity={fresh ? 1 : FADED}>
            <PlaceMarks
              page={page}
              size={size}
              read={spot ? { index: at, values: curveWords(spot, units) } : null}
              palette={palette}
            />
          </Layer>
          <Layer listening={false}>
            <PlaceHead
              page={page}
              size={button ? { ...size, width: size.width - BUTTON.width } : size}
              words={spot ? headWords(spot, press, units) : fresh ? [] : [OLD]}
              palette={palette}
            />
          </Layer>
        </Stage>
      </div>
      {button && (
        <button type="button" style={BUTTON} onClick={() => ask(index)}>
          Move it there
        </button>
      )}
    </div>
  );
}

const readOut = (spot: StudySpot, fresh: boolean, units: UnitSystem): string =>
  [stationSentence(spot, units), fresh ? (spot.strikes ? '' : ENTER) : OLD].filter(Boolean).join(' ');

const BUTTON = { position: 'absolute', top: 0, right: 0, width: 120 } as const;

const CLICK = 'Click moves it there.';
const ENTER = 'Enter moves it there.';

const PLOT: CSSProperties = {
  position: 'relative',
  width: '100%',
  height: '100%',
  overflow: 'hidden',
  outlineOffset: -3,
  userSelect: 'none',
};
