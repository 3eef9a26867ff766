/** Two crafts side by side in the figures that matter to a plan, and in what hangs or stands differently. */
import { useMemo } from 'react';
import type { Craft } from '../../craft/craft.ts';
import { planDifferences } from '../../report/planDifferences.ts';
import { planFigures } from '../../report/planFigures.ts';
import type { Row } from '../../report/row.ts';
import { formatQuantity } from '../../units/format.ts';
import { inUnits } from '../../units/sentence.ts';
import type { UnitSystem } from '../../units/units.ts';
import { useEditor } from '../editor.ts';

export interface Side {
  readonly head: string;
  readonly craft: Craft;
}

interface ComparedProps {
  readonly title: string;
  readonly sides: readonly [Side, Side];
  /** Whether to tell what is where, by default not: where the steps of the plan stand beside it they say so. */
  readonly places?: boolean;
}

export function Compared({ title, sides: [one, other], places }: ComparedProps) {
  const { units } = useEditor();
  const before = useMemo(() => planFigures(one.craft), [one.craft]);
  const after = useMemo(() => planFigures(other.craft), [other.craft]);
  return (
    <table className="compared">
      <caption>{title}</caption>
      <thead>
        <tr>
          <th scope="col">
            <span className="spoken">Figure</span>
          </th>
          <th scope="col">{one.head}</th>
          <th scope="col">{other.head}</th>
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
      {places && <Differences one={one.craft} other={other.craft} />}
    </table>
  );
}

function Differences({ one, other }: { one: Craft; other: Craft }) {
  const { units } = useEditor();
  const differences = useMemo(() => planDifferences(one, other), [one, other]);
  return (
    <tbody className="differences">
      <tr>
        <th scope="rowgroup" colSpan={3}>
          {differences.length > 0 ? 'What differs' : 'Everything is in the same place.'}
        </th>
      </tr>
      {differences.map(({ key, label, words }) => (
        <tr key={key}>
          <th scope="row">{label}</th>
          <td className="number">{inUnits(words[0], units)}</td>
          <td className="number">{inUnits(words[1], units)}</td>
        </tr>
      ))}
    </tbody>
  );
}

/** Without its uncertainty, which stands in the figures: side by side only the difference is read. */
const figure = ({ value, quantity }: Row, units: UnitSystem): string =>
  value === null ? 'none' : formatQuantity(value, quantity, units);
