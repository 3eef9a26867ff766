/** The yaw moment there is against what is needed, and what each of its makers leaves of the greatest there could be. */
import type { Row } from '../../report/row.ts';
import { rowText } from '../../report/rowText.ts';
import { useEditor } from '../editor.ts';

const SHARES: readonly (readonly [name: string, key: string])[] = [
  ['Vectoring', 'turn.shareVectoring'],
  ['Arm', 'turn.shareArm'],
  ['Thrust', 'turn.shareThrust'],
];

export function MomentBars({ rows }: { rows: Readonly<Record<string, Row>> }) {
  const { units } = useEditor();
  const has = rows['turn.yawMoment'];
  if (!has || has.value === null) return null;
  const needed = rows['turn.neededMoment'];
  return (
    <section className="moment" aria-label="Yaw moment and what makes it">
      <p>
        <strong>Yaw moment</strong> {rowText(has, units)}
        {needed?.value != null && `, needed ${rowText(needed, units)}`}
      </p>
      <ul>
        {SHARES.map(([name, key]) => {
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
