/** What notes over the views say of a propeller or a fin inside the hull. */
import type { BeamBar } from '../report/assessment.ts';
import { insideWords } from '../report/insideHull.ts';
import { inUnits } from '../units/sentence.ts';
import type { Geometry, Subject } from './subject.ts';

/** No line, or one. */
export function insideLines(
  { craft, units }: Subject,
  { pieces, hull }: Geometry,
  { kind, id }: Pick<BeamBar, 'kind' | 'id'>,
): string[] {
  const part = kind === 'part' ? craft.parts.byId[id] : undefined;
  const own = pieces.filter((piece) => piece.part === id);
  const words = part && insideWords(part, own, hull);
  return words ? [inUnits(words, units)] : [];
}
