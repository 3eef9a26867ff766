/** Plays a turn: which one is chosen above the drawing, time and figures stand below it. Nothing moves until it is asked to. */
import { type CSSProperties, useMemo, useRef, useState } from 'react';
import type { Palette } from '../scene/palette.ts';
import type { Geometry, UnitSystem } from '../scene/subject.ts';
import {
  durationOf,
  layTurn,
  type Run,
  runInWords,
  runsOf,
  type Sailor,
  sailorOf,
  sameThrust,
  standAt,
  standFigures,
  type Track,
  type Turn,
} from '../scene/turnPath.ts';
import { TurnPath } from './TurnPath.tsx';
import { usePlayback } from './usePlayback.ts';
import { useSame } from './useSame.ts';
import { useSize } from './useSize.ts';

export interface TurnPathPlayerProps {
  readonly turn: Turn;
  readonly geometry: Geometry;
  readonly units: UnitSystem;
  readonly palette: Palette;
}

export function TurnPathPlayer({ turn, geometry, units, palette }: TurnPathPlayerProps) {
  const [chosen, setChosen] = useState(0);
  const runs = useMemo(() => runsOf(turn, units), [turn, units]);
  // Turning an arrow leaves its place and strength as they are, and so all that is drawn here but what the track tells.
  const thrust = useSame(geometry.thrust, sameThrust);
  const { hull } = geometry;
  // biome-ignore lint/correctness/useExhaustiveDependencies: the CB is where the hull has it
  const sailor = useMemo(() => sailorOf({ ...geometry, thrust }), [hull, thrust]);
  const run = runs[chosen]!;
  return (
    <div style={COLUMN} data-testid="turn-player">
      {/* biome-ignore lint/a11y/useSemanticElements: a fieldset would draw a frame */}
      <div role="group" aria-label="Which turn" style={ROW}>
        {runs.map(({ label }, i) => (
          <button key={label} type="button" aria-pressed={i === chosen} onClick={() => setChosen(i)}>
            {label}
          </button>
        ))}
      </div>
      {run.track ? (
        <Played key={run.label} {...{ run, sailor, units, palette }} track={run.track} />
      ) : (
        <p>{run.why}</p>
      )}
    </div>
  );
}

interface PlayedProps extends Pick<TurnPathPlayerProps, 'units' | 'palette'> {
  readonly run: Run;
  readonly track: Track;
  readonly sailor: Sailor;
}

function Played({ run, track, sailor, units, palette }: PlayedProps) {
  const frame = useRef<HTMLDivElement>(null);
  const size = useSize(frame);
  const duration = durationOf(track);
  const { time, playing, play, pause, seek } = usePlayback(duration);
  const { before } = run;
  const page = useMemo(
    () => layTurn(track, before, sailor, size, units),
    [track, before, sailor, size, units],
  );
  const stand = standAt(track, time);
  const figures = standFigures(stand, time, units);
  return (
    <>
      <div
        ref={frame}
        role="img"
        aria-label={runInWords(run, units)}
        style={{ ...DRAWING, background: palette.paper, borderColor: palette.line }}
      >
        {page && <TurnPath {...{ page, sailor, stand, palette }} />}
      </div>
      <div style={ROW}>
        <button type="button" onClick={playing ? pause : play} style={PLAY}>
          {playing ? 'Pause' : 'Play'}
        </button>
        <input
          type="range"
          aria-label="Time in the turn"
          aria-valuetext={figures.map(({ name, value }) => `${name} ${value}`).join(', ')}
          min={0}
          max={duration}
          step={duration / STEPS || 'any'}
          value={time}
          onChange={(event) => seek(event.currentTarget.valueAsNumber)}
          style={{ ...SLIDER, accentColor: palette.brass }}
        />
      </div>
      <dl style={FIGURES}>
        {figures.map(({ name, value }) => (
          <div key={name}>
            <dt style={{ color: palette.inkSoft, fontSize: 12 }}>{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
    </>
  );
}

/** Of the slider, from one end to the other. */
const STEPS = 60;

const COLUMN: CSSProperties = { display: 'grid', gap: 8 };
const ROW: CSSProperties = { display: 'flex', gap: 6, alignItems: 'center' };
const PLAY: CSSProperties = { minWidth: 72 };
const SLIDER: CSSProperties = { flex: 1, minWidth: 0 };
const DRAWING: CSSProperties = {
  height: 260,
  minWidth: 0,
  overflow: 'hidden',
  border: '1px solid',
  borderRadius: 6,
};
const FIGURES: CSSProperties = {
  display: 'grid',
  gridTemplateColumns: 'repeat(4, auto)',
  gap: 8,
  fontVariantNumeric: 'tabular-nums',
};
