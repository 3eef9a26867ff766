/** The yaw moment there is against what is needed, and what each of its makers leaves of the greatest there could be. */
import type { Row } from '../../report/row.ts';
import { rowText } from '../../report/rowText.ts';
import type { HarderNeed } from '../../report/turning/harderNeed.ts';
import { useEditor } from '../editor.ts';
import { steeringPart } from './asked.ts';
import { useTurning } from './turning.ts';

interface MomentBarsProps {
  readonly rows: Readonly<Record<string, Row>>;
  readonly need: HarderNeed | null;
}

export function MomentBars({ rows, need }: MomentBarsProps) {
  const { craft, units } = useEditor();
  const turning = useTurning();
  const has = rows['turn.yawMoment'];
  if (!has || has.value === null) return null;
  const turnable = steeringPart(craft, turning) !== null;
  const hardest = turnable && turning.steering === 'set' ? ', steered hardest' : '';
  const gust = need?.target === 'sideGust';
  const shares = [
    // Of a pair throttled apart it is how much of its thrust it gives backwards.
    [turnable ? 'Vectoring' : 'Reverse', 'turn.shareVectoring'],
    ['Arm', 'turn.shareArm'],
    ['Thrust', 'turn.shareThrust'],
  ] as const;
  return (
    <section className="moment" aria-label="Yaw moment and what makes it">
      <p>
        <strong>
          Yaw moment{gust && ' in the side gust'}
          {hardest}
        </strong>{' '}
        {rowText(gust ? need.there : has, units)}
        {need && `, needed ${gust ? '' : 'for the turn time '}${rowText(need.needed, units)}`}
      </p>
      <p className="aside">Of the most all its thrust could do at the longest arm:</p>
      <ul>
        {shares.map(([name, key]) => {
          const row = rows[key];
          return (
            row && (
              <li key={key} title={row.why}>
                <span>{name}</span>
                <meter min={0} max={1} value={row.value ?? 0} aria-label={`${name}: ${row.why}`} />
                <span className="number">{rowText(row, units)}</span>
              </li>
            )
          );
        })}
      </ul>
    </section>
  );
}
