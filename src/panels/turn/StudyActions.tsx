/** Of one row: why the propeller has no room there, what the ballast plan changes, and the ways to carry it out. */
import { moveAndHang, moveThruster } from '../../edit/edits/moveThruster.ts';
import { placed } from '../../edit/place.ts';
import { joined } from '../../report/planWords.ts';
import { stowageSteps } from '../../report/turning/placeSteps.ts';
import type { PlacedPoint } from '../../report/turning/studies.ts';
import { inUnits } from '../../units/sentence.ts';
import { useEditor } from '../editor.ts';
import { useStudying } from './studying.ts';

interface StudyActionsProps {
  readonly point: PlacedPoint;
  /** Its station as shown. */
  readonly at: string;
  readonly fresh: boolean;
}

export function StudyActions({ point, at, fresh }: StudyActionsProps) {
  const { craft, units, apply, dragging } = useEditor();
  const { part } = useStudying();
  const thruster = craft.parts.byId[part ?? ''];
  if (!thruster) return null;
  if (thruster.locked)
    return <p className="aside">{thruster.name || 'It'} is locked. Unlock it to move it.</p>;
  const { stowage } = point;
  const ready = fresh && !dragging;
  const here = placed(thruster.place, point.place) === thruster.place;
  const steps = stowage ? stowageSteps(craft, stowage, units) : [];
  return (
    <>
      {[point.why, ...point.cautions].filter(Boolean).map((matter) => (
        <p className="row-why" key={matter}>
          {inUnits(matter, units)}
        </p>
      ))}
      {steps.length > 0 && <p className="study-steps">With the ballast: {joined(steps)}.</p>}
      <span className="plan-actions">
        {here ? (
          <span className="aside">It is there now.</span>
        ) : (
          <button
            type="button"
            aria-disabled={!ready}
            onClick={() => ready && apply(moveThruster(thruster, point.place))}
          >
            Move it there<span className="spoken">, to {at}</span>
          </button>
        )}
        {stowage && (!here || steps.length > 0) && (
          <button
            type="button"
            aria-disabled={!ready}
            onClick={() => ready && apply(moveAndHang(thruster, point.place, stowage))}
          >
            {here ? 'Hang the ballast' : 'Move it, hang the ballast'}
            <span className="spoken">, at {at}</span>
          </button>
        )}
      </span>
    </>
  );
}
