/** Thrust against drag, the turn over what is steered, the climb over vectoring in pitch. None where there is too little to draw. */
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
        { name: 'thrust', points: thrust },
        { name: 'drag', points: drag },
      ]}
      x={{ ...axisOf(xs(thrust), 'speed', units), name: 'speed' }}
      y={y}
    />
  );
}

/** Wider turns than so many times the tightest are left out: towards straight ahead the radius has no end. */
const WIDEST = 6;

export function SteadyPlot({ curve }: { curve: readonly SteadyPoint[] }) {
  const { units } = useEditor();
  const byAngle = curve.some(({ vector }) => vector !== 0);
  const all = curve.flatMap(({ share, vector, turn, settles }) =>
    turn.status === 'solved' && settles
      ? [{ x: Math.abs(byAngle ? vector : share), y: turn.value.radius }]
      : [],
  );
  const tightest = Math.min(...ys(all));
  const radius = all.filter(({ y }) => y <= WIDEST * tightest);
  if (radius.length < LEAST_POINTS) return null;
  return (
    <SmallPlot
      title={byAngle ? 'Radius over vectoring' : 'Radius over thrust apart'}
      words={`The radius falls to ${formatQuantity(tightest, 'pathLength', units)} at its least.`}
      curves={[{ name: 'radius', points: radius }]}
      x={{
        ...axisOf(xs(radius), byAngle ? 'angle' : 'fraction', units),
        name: byAngle ? 'angle in yaw' : 'share of what there is',
      }}
      y={axisOf(ys(radius), 'pathLength', units)}
    />
  );
}

export function ClimbPlot({ curve }: { curve: readonly ClimbPoint[] }) {
  const { units } = useEditor();
  const climb = curve.flatMap(({ vector, climb: each }) =>
    each.status === 'solved' ? [{ x: vector, y: each.value.climbRate }] : [],
  );
  if (climb.length < LEAST_POINTS) return null;
  return (
    <SmallPlot
      title="Climb over vectoring in pitch"
      words={`It climbs at ${formatQuantity(Math.max(...ys(climb)), 'speed', units)} at most.`}
      curves={[{ name: 'climb', points: climb }]}
      x={{ ...axisOf(xs(climb), 'angle', units), name: 'thrust turned up' }}
      y={axisOf(ys(climb), 'speed', units)}
    />
  );
}
