/** Which way thrust points in yaw or in pitch, and, where it turns, how far and how fast. */
import type { Problem } from '../../craft/problem.ts';
import type { Vectoring } from '../../craft/thrustSchema.ts';
import type { Way } from '../../edit/edits/thrust.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { FigureField, type SetFigures } from './FigureField.tsx';

interface VectoringFieldsProps {
  readonly way: Way;
  readonly vectoring: Vectoring;
  onVectoring(vectoring: Vectoring, field: string, run?: string): Problem | null;
}

const POSITIVE = { yaw: '+ thrust to starboard', pitch: '+ thrust up' } as const;

export function VectoringFields({ way, vectoring, onVectoring }: VectoringFieldsProps) {
  const { notify } = useEditor();
  const turning = vectoring.least !== vectoring.most;
  const set: SetFigures<Vectoring> = (field, change, run) => {
    const next = { ...vectoring, ...change };
    // The gate would name the smallest as the one at fault, whichever was typed.
    return 'most' in change && next.most < next.least
      ? { path: '', found: String(next.most), allowed: `at least ${next.least}` }
      : onVectoring(next, field, run);
  };
  const check = (may: boolean) => {
    const problem = onVectoring(
      may ? freed(vectoring) : fixed(vectoring, vectoring.set),
      `turning in ${way}`,
    );
    if (problem) notify(`Allowed: ${problem.allowed}.`, 'bad');
  };
  const shared = { figures: vectoring, quantity: 'angle', set } as const;
  return (
    <>
      <CheckField label={`Turns in ${way}`} value={turning} onCommit={check} />
      <FigureField
        {...shared}
        label={turning ? `Turned in ${way}` : `Fixed in ${way}`}
        name="set"
        hint={POSITIVE[way]}
        set={
          turning ? set : (field, { set: angle }, run) => onVectoring(fixed(vectoring, angle!), field, run)
        }
      />
      {turning && (
        <>
          <FigureField {...shared} label={`Smallest ${way}`} name="least" />
          <FigureField {...shared} label={`Greatest ${way}`} name="most" />
          <FigureField
            {...shared}
            label={`Slew in ${way}`}
            name="slew"
            quantity="yawRate"
            hint="How fast it turns"
          />
        </>
      )}
    </>
  );
}

const FIRST_REACH = Math.PI / 6;
const FIRST_SLEW = (200 * Math.PI) / 180;

const fixed = (vectoring: Vectoring, angle: number): Vectoring => ({
  ...vectoring,
  least: angle,
  most: angle,
  set: angle,
});

/** 30° either way of where it points. */
const freed = ({ set, slew }: Vectoring): Vectoring => ({
  least: Math.max(set - FIRST_REACH, -Math.PI),
  most: Math.min(set + FIRST_REACH, Math.PI),
  set,
  slew: slew || FIRST_SLEW,
});
