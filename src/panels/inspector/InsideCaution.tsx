/** That a propeller or a fin is inside the hull, where it says what it does. */
import type { Part } from '../../craft/schema.ts';
import { insideWords } from '../../report/insideHull.ts';
import { inUnits } from '../../units/sentence.ts';
import { useEditor } from '../editor.ts';

export function InsideCaution({ part }: { part: Part }) {
  const { assessment, units } = useEditor();
  const { geometry } = assessment;
  if (geometry.status !== 'solved') return null;
  const pieces = geometry.pieces.filter((piece) => piece.part === part.id);
  const words = insideWords(part, pieces, geometry.hull);
  return words && <p className="amiss">{inUnits(words, units)}</p>;
}
