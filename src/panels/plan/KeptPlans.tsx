/** Plans put by to be compared, with today or two by two: each as it would be on the craft of now. */
import { useMemo } from 'react';
import type { Craft } from '../../craft/craft.ts';
import { stowed } from '../../craft/stowage.ts';
import { applyPlan } from '../../edit/edits/plan.ts';
import { movedParts } from '../../report/movedParts.ts';
import { planFigures } from '../../report/planFigures.ts';
import { formatQuantity } from '../../units/format.ts';
import { useEditor } from '../editor.ts';
import { KeptBeside } from './KeptBeside.tsx';
import { type KeptPlan, usePlanning } from './planning.ts';

const FIGURES = ['deadBallast', 'usefulLoad', 'float.pitch'];
const HEADS = ['Plan', 'Dead ballast', 'Useful load', 'Pitch', 'Parts moved'];

export function KeptPlans() {
  const { craft } = useEditor();
  const { kept, shown } = usePlanning();
  if (kept.length === 0) return null;
  return (
    <>
      <div className="plan-scroll">
        <table className="kept-plans">
          <caption>Kept plans</caption>
          <thead>
            <tr>
              {HEADS.map((head) => (
                <th scope="col" key={head}>
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {kept.map((each) => (
              <KeptRow key={each.number} kept={each} craft={craft} />
            ))}
          </tbody>
        </table>
      </div>
      {shown && <KeptBeside shown={shown} />}
    </>
  );
}

function KeptRow({ kept, craft }: { kept: KeptPlan; craft: Craft }) {
  const { units, apply } = useEditor();
  const { shown, show, drop } = usePlanning();
  const then = useMemo(() => stowed(craft, kept.stowage), [craft, kept]);
  const figures = useMemo(() => planFigures(then), [then]);
  const isShown = shown === kept;
  const name = `plan ${kept.number}`;
  return (
    <>
      <tr>
        <th scope="row">
          {kept.number}
          {kept.robust && <span className="aside"> robust</span>}
          {!figures.met && <span className="field-error"> misses a target</span>}
        </th>
        {FIGURES.map((key) => (
          <td className="number" key={key}>
            {figures.rows.map(
              ({ key: each, row }) =>
                each === key &&
                (row.value === null ? 'none' : formatQuantity(row.value, row.quantity, units)),
            )}
          </td>
        ))}
        <td className="number">{movedParts(craft, then)}</td>
      </tr>
      <tr className="kept-actions">
        <td colSpan={HEADS.length}>
          <span className="plan-actions">
            <button type="button" aria-pressed={isShown} onClick={() => show(isShown ? null : kept)}>
              Show<span className="spoken"> {name}</span>
            </button>
            <button type="button" onClick={() => apply(applyPlan(kept.stowage))}>
              Apply<span className="spoken"> {name}</span>
            </button>
            <button type="button" onClick={() => drop(kept)}>
              Drop<span className="spoken"> {name}</span>
            </button>
          </span>
        </td>
      </tr>
    </>
  );
}
