/** Thrust against drag, the turn over what is steered, the climb over vectoring in pitch. None where there is too little to draw. */
import type { Rows } from '../../report/rows.ts';
import { climbPieces } from '../../report/turning/climbPieces.ts';
import type { ClimbPoint, SpeedPoint, SteadyPoint } from '../../report/turning/turns.ts';
import { formatQuantity } from '../../units/format.ts';
import type { Quantity, UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { type PlotAxis, type PlotPoint, SmallPlot } from './SmallPlot.tsx';

const LEAST_POINTS = 3;

function axisOf(values: readonly number[], quantity: Quantity, units: UnitSystem): PlotAxis {
  const [least, most] = [Math.min(0, ...values), Math.max(0, ...values)];
  const words = (value: number) => (value === 0 ? '0' : formatQuantity(value, quantity, units));
  return { least, most, leastWords: words(least), mostWords: words(most) };
}

const xs = (points: readonly PlotPoint[]): number[] => points.map(({ x }) => x);
const ys = (points: readonly PlotPoint[]): number[] => points.map(({ y }) => y);

export function SpeedPlot({ curve }: { curve: readonly SpeedPoint[] }) {
  const { units } = useEditor();
  if (curve.length < LEAST_POINTS) return null;
  const thrust = curve.map(({ speed, thrust: y }) => ({ x: speed, y }));
  const drag = curve.map(({ speed, drag: y }) => ({ x: speed, y }));
  const y = axisOf(ys([...thrust, ...drag]), 'force', units);
  return (
    <SmallPlot
      title="Force over speed"
      words="Thrust falls and drag grows with speed; where they meet is the steady speed."
      curves={[
        { name: 'thrust', pieces: [thrust] },
        { name: 'drag', pieces: [drag] },
      ]}
      x={{ ...axisOf(xs(thrust), 'speed', units), name: 'speed' }}
      y={y}
    />
  );
}

/** The axis begins a little below the tightest turn. */
const BELOW = 0.8;

/** Every circle that holds, on a scale of equal ratios: towards straight ahead the radius grows without end. */
export function SteadyPlot({ curve }: { curve: readonly SteadyPoint[] }) {
  const { units } = useEditor();
  const byAngle = curve.some(({ vector }) => vector !== 0);
  const held = curve.flatMap(({ share, vector, turn, settles }) =>
    turn.status === 'solved' && settles
      ? [{ x: Math.abs(byAngle ? vector : share), y: turn.value.radius }]
      : [],
  );
  if (held.length < LEAST_POINTS) return null;
  const [tightest, widest] = [Math.min(...ys(held)), Math.max(...ys(held))];
  const bottom = BELOW * tightest;
  const words = (radius: number) => formatQuantity(radius, 'pathLength', units);
  const points = held.map(({ x, y }) => ({ x, y: Math.log(y / bottom) / Math.log(widest / bottom) }));
  return (
    <SmallPlot
      title={`Radius over ${byAngle ? 'vectoring' : 'thrust apart'} (log scale)`}
      words={`The radius falls from ${words(widest)} to ${words(tightest)} at its least.`}
      curves={[{ name: 'radius', pieces: [points] }]}
      x={{
        ...axisOf(xs(points), byAngle ? 'angle' : 'fraction', units),
        name: byAngle ? 'angle in yaw' : 'share of what there is',
      }}
      y={{ least: 0, most: 1, leastWords: words(bottom), mostWords: words(widest) }}
    />
  );
}

export function ClimbPlot({ curve, rows }: { curve: readonly ClimbPoint[]; rows: Rows }) {
  const { units } = useEditor();
  const pieces = climbPieces(curve, rows);
  const climb = pieces.flat();
  if (climb.length < LEAST_POINTS) return null;
  const broken = pieces.length > 1 ? ' The line is broken where there is no steady path near level.' : '';
  return (
    <SmallPlot
      title="Climb over vectoring in pitch"
      words={`It climbs at ${formatQuantity(Math.max(...ys(climb)), 'speed', units)} at most.${broken}`}
      curves={[{ name: 'climb', pieces }]}
      x={{ ...axisOf(xs(climb), 'angle', units), name: 'thrust turned up' }}
      y={axisOf(ys(climb), 'speed', units)}
    />
  );
}
