/** The thrust of the craft with other propellers: what it would cost in ideal power. */
import { rowText } from '../../report/rowText.ts';
import { PROPELLERS_LEAVE_OUT, type PropellerLine } from '../../report/turning/propellers.ts';
import { useEditor } from '../editor.ts';

const HEADS = ['Propellers', 'Discs', 'At rest', 'Against today', 'At top speed', 'Against today'];

export function PropellerTable({ lines }: { lines: readonly PropellerLine[] }) {
  const { units } = useEditor();
  return (
    <div className="plan-scroll">
      <table className="study-table">
        <caption>Ideal power for the same thrust</caption>
        <thead>
          <tr>
            {HEADS.map((head, i) => (
              // biome-ignore lint/suspicious/noArrayIndexKey: two columns have one head
              <th scope="col" key={i}>
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {lines.map(({ name, ...figures }) => (
            <tr key={name}>
              <th scope="row">{name}</th>
              <td className="number">{rowText(figures.area, units)}</td>
              <td className="number">{rowText(figures.atRest, units)}</td>
              <td className="number">{rowText(figures.atRestOverToday, units)}</td>
              <td className="number">{rowText(figures.atTop, units)}</td>
              <td className="number">{rowText(figures.atTopOverToday, units)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="source">
        Momentum theory. {PROPELLERS_LEAVE_OUT} The shaft takes more, by the figure of merit.
      </p>
    </div>
  );
}
