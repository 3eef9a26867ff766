/** The pieces of lead at hand. */
import type { LeadPiece } from '../../craft/planningSchema.ts';
import { addLeadPiece, removeLeadPieces, setLeadPiece } from '../../edit/edits/lead.ts';
import { unitOf } from '../../units/units.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { CountField } from '../fields/CountField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';

export function LeadPieces() {
  const { craft, units, apply } = useEditor();
  const { pieces } = craft;
  return (
    <>
      <p className="aside">For hardpoints set to take pieces; the others take lead cut to measure.</p>
      {pieces.length > 0 && (
        <table className="rows-table" aria-label="Pieces of lead">
          <thead>
            <tr>
              <th scope="col">Mass of one, {unitOf('mass', units).symbol}</th>
              <th scope="col">How many</th>
              <th scope="col">
                <span className="spoken">Remove</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {pieces.map((piece, index) => (
              // biome-ignore lint/suspicious/noArrayIndexKey: a size of lead has no name of its own but its place in the table
              <PieceRow key={index} piece={piece} index={index} />
            ))}
          </tbody>
        </table>
      )}
      <button type="button" onClick={() => apply(addLeadPiece({ mass: freeMass(pieces), count: 10 }))}>
        Add pieces of lead
      </button>
    </>
  );
}

function PieceRow({ piece, index }: { piece: LeadPiece; index: number }) {
  const { units, apply } = useEditor();
  const commit = useCommit();
  const name = `lead ${index + 1}`;
  return (
    <tr>
      <td>
        <QuantityField
          bare
          label={`Mass of ${name}`}
          value={piece.mass}
          quantity="mass"
          units={units}
          onCommit={(mass, run) => commit(setLeadPiece(index, 'mass', { mass }), run)}
        />
      </td>
      <td>
        <CountField
          bare
          label={`Number of ${name}`}
          value={piece.count}
          onCommit={(count) => commit(setLeadPiece(index, 'number', { count }))}
        />
      </td>
      <td className="row-actions">
        <button type="button" aria-label={`Remove ${name}`} onClick={() => apply(removeLeadPieces([index]))}>
          −
        </button>
      </td>
    </tr>
  );
}

/** Each mass stands once: 5 g, else 10 g, 15 g, … */
function freeMass(pieces: readonly LeadPiece[]): number {
  const taken = new Set(pieces.map(({ mass }) => mass));
  const grams = Array.from({ length: pieces.length + 1 }, (_, i) => (i + 1) * 5);
  return grams.map((each) => each / 1000).find((mass) => !taken.has(mass)) ?? 0.005;
}
