/** Two crafts side by side in the figures that matter to a plan. */
import { useMemo } from 'react';
import type { Craft } from '../../craft/craft.ts';
import { planFigures } from '../../report/planFigures.ts';
import type { Row } from '../../report/row.ts';
import { formatQuantity } from '../../units/format.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';

interface ComparedProps {
  readonly today: Craft;
  readonly then: Craft;
  readonly title: string;
}

export function Compared({ today, then, title }: ComparedProps) {
  const { units } = useEditor();
  const before = useMemo(() => planFigures(today), [today]);
  const after = useMemo(() => planFigures(then), [then]);
  return (
    <table className="compared">
      <caption>{title}</caption>
      <thead>
        <tr>
          <th scope="col">
            <span className="spoken">Figure</span>
          </th>
          <th scope="col">Today</th>
          <th scope="col">Plan</th>
        </tr>
      </thead>
      <tbody>
        {before.rows.map(({ key, row }, i) => (
          <tr key={key} data-figure={key}>
            <th scope="row">{row.label}</th>
            <td className="number">{figure(row, units)}</td>
            <td className="number">{after.rows[i] && figure(after.rows[i].row, units)}</td>
          </tr>
        ))}
        <tr>
          <th scope="row">Meets its targets</th>
          <td className="number">{before.met ? 'yes' : 'no'}</td>
          <td className="number">{after.met ? 'yes' : 'no'}</td>
        </tr>
      </tbody>
    </table>
  );
}

/** Without its uncertainty, which stands in the figures: side by side only the difference is read. */
const figure = ({ value, quantity }: Row, units: UnitSystem): string =>
  value === null ? 'none' : formatQuantity(value, quantity, units);
