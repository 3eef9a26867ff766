/** What a fin does: its outline. */
import { finOutline } from '../../craft/finOutline.ts';
import { finOfBox, isBoxed } from '../../craft/firstFigures.ts';
import type { Part } from '../../craft/schema.ts';
import type { FinData } from '../../craft/thrustSchema.ts';
import { finFromBox, setFin, takeFin } from '../../edit/edits/thrust.ts';
import { formatQuantity } from '../../units/format.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { FactList } from './FactList.tsx';
import { FigureField, type SetFigures } from './FigureField.tsx';
import { InsideCaution } from './InsideCaution.tsx';

export function FinFields({ part }: { part: Part }) {
  const { apply } = useEditor();
  const { fin, size, kind } = part;
  return (
    <section className="panel-part" aria-label="Fin">
      <h3>Fin</h3>
      {fin ? (
        <Outline part={part} fin={fin} />
      ) : (
        <p className="aside">It has no outline yet: it steadies nothing.</p>
      )}
      <button
        type="button"
        disabled={finOfBox(size) === null || (fin !== null && isBoxed(fin, size))}
        onClick={() => apply(finFromBox(part))}
      >
        From its box
      </button>
      {fin && kind !== 'fin' && (
        <button type="button" onClick={() => apply(takeFin(part))}>
          Remove the fin figures
        </button>
      )}
    </section>
  );
}

function Outline({ part, fin }: { part: Part; fin: FinData }) {
  const { units } = useEditor();
  const commit = useCommit();
  const set: SetFigures<FinData> = (field, change, run) => commit(setFin(part, field, change), run);
  const { span, chord } = finOutline(fin);
  const length = (value: number) => formatQuantity(value, 'smallLength', units);
  return (
    <>
      <InsideCaution part={part} />
      <FigureField
        label="Outline area"
        figures={fin}
        name="area"
        quantity="area"
        hint="Of one fin, outside the hull"
        set={set}
      />
      <FigureField
        label="Aspect ratio"
        figures={fin}
        name="aspectRatio"
        quantity="ratio"
        hint="Span squared over area"
        set={set}
      />
      <FactList facts={[{ label: 'Span, mean chord', text: `${length(span)}, ${length(chord)}` }]} />
    </>
  );
}
