/** What a table of parts would add, as the ledger would show it, and in which units its bare numbers were taken. */

import { stationOf } from '../craft/station.ts';
import type { PartFields } from '../edit/edits/parts.ts';
import { formatQuantity } from '../units/format.ts';
import { copiesText } from './csv/copiesText.ts';
import { type StationDoubt, stationDoubt } from './csv/doubt.ts';
import type { AssumedUnit } from './csv/readParts.ts';
import { hullLengthOf } from './defaults.ts';
import { useEditor } from './editor.ts';
import { PART_WORDS, PLACE_WORDS } from './words.ts';

interface PastePreviewProps {
  readonly parts: readonly PartFields[];
  readonly assumed: readonly AssumedUnit[];
}

export function PastePreview({ parts, assumed }: PastePreviewProps) {
  return (
    <>
      {assumed.length > 0 && (
        <p>
          Without a unit of its own: {assumed.map(({ column, unit }) => `${column} in ${unit}`).join(', ')}.
          Write another into the head, as in “station mm”.
        </p>
      )}
      <DoubtLine parts={parts} />
      <PreviewTable parts={parts.slice(0, 100)} />
      {parts.length > 100 && <p className="aside">And {parts.length - 100} more.</p>}
    </>
  );
}

const DOUBTS: Readonly<Record<Exclude<StationDoubt, null>, string>> = {
  crowded: 'All of them sit within a hundredth of the hull’s length from the nose.',
  beyond: 'Some of them sit beyond the hull.',
};

function DoubtLine({ parts }: Pick<PastePreviewProps, 'parts'>) {
  const { assessment, units } = useEditor();
  const length = hullLengthOf(assessment);
  const doubt = length === null ? null : stationDoubt(parts, length);
  if (doubt === null || length === null) return null;
  return (
    <p className="caution" role="alert">
      <strong>Mind the stations:</strong> {DOUBTS[doubt]} The hull is{' '}
      {formatQuantity(length, 'length', units)} long. Is their unit the right one?
    </p>
  );
}

function PreviewTable({ parts }: Pick<PastePreviewProps, 'parts'>) {
  const { units } = useEditor();
  return (
    <table className="problem-table preview">
      <caption>To be added</caption>
      <thead>
        <tr>
          <th scope="col">Name</th>
          <th scope="col">Kind</th>
          <th scope="col" className="number">
            Mass
          </th>
          <th scope="col" className="number">
            ±
          </th>
          <th scope="col">Place</th>
          <th scope="col" className="number">
            Station
          </th>
          <th scope="col">Copies</th>
        </tr>
      </thead>
      <tbody>
        {parts.map((part, index) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: rows of a table have no name but their place in it
          <tr key={index}>
            <td>{part.name}</td>
            <td>{PART_WORDS[part.kind]}</td>
            <td className="number">{formatQuantity(part.mass, 'mass', units)}</td>
            <td className="number">
              {part.massTolerance > 0 && formatQuantity(part.massTolerance, 'mass', units)}
            </td>
            <td>{PLACE_WORDS[part.place.kind]}</td>
            <td className="number">{formatQuantity(stationOf(part.place), 'length', units)}</td>
            <td>{copiesText(part.copies)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
