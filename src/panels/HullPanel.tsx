/** The hull: its form, seams and patches, and what comes of them. */
import type { HullSpec } from '../craft/hullSchema.ts';
import { chooseShape, setHull } from '../edit/edits/craft.ts';
import { shapeAs } from '../edit/shapeAs.ts';
import { keelOutline } from '../report/outline.ts';
import { useCommit } from './commit.ts';
import { useEditor } from './editor.ts';
import { ChoiceField } from './fields/ChoiceField.tsx';
import { CountField } from './fields/CountField.tsx';
import { QuantityField } from './fields/QuantityField.tsx';
import { PatchesTable } from './hull/PatchesTable.tsx';
import { RowsTable } from './hull/RowsTable.tsx';
import { ShapeFields } from './hull/ShapeFields.tsx';
import { hasRows } from './hull/shapeFields.ts';
import { RowList } from './RowList.tsx';
import { SHAPE_CHOICES } from './words.ts';
import './hull/hull.css';

const HULL_ROWS = [
  'hull.length',
  'hull.diameter',
  'hull.fineness',
  'hull.volume',
  'hull.area',
  'hull.cbStation',
  'hull.filmMass',
  'hull.seamMass',
  'hull.skinMass',
  'hull.skinStation',
];

export function HullPanel() {
  const { craft, assessment, units } = useEditor();
  const commit = useCommit();
  const { shape, seams, patches } = craft.hull;
  const { geometry, rows } = assessment;
  const outline = geometry.status === 'solved' ? keelOutline(geometry.hull) : null;
  return (
    <section className="panel" aria-label="Hull">
      <ChoiceField
        label="Shape"
        value={shape.kind}
        choices={SHAPE_CHOICES}
        onCommit={(kind) => commit(chooseShape(shapeAs(kind, shape, outline)))}
      />
      <ShapeFields shape={shape} />
      {hasRows(shape) && <RowsTable shape={shape} />}
      {geometry.status === 'infeasible' && (
        <p className="field-error" role="alert">
          {assessment.headline}
        </p>
      )}
      <SeamFields seams={seams} counted={shape.kind !== 'gores' && shape.kind !== 'twoSheet'} />
      <PatchesTable patches={patches} />
      <RowList rows={HULL_ROWS.map((key) => rows[key])} units={units} />
    </section>
  );
}

/** Gores and two sheets have as many seams as their pattern says. */
function SeamFields({ seams, counted }: { seams: HullSpec['seams']; counted: boolean }) {
  const { units } = useEditor();
  const commit = useCommit();
  return (
    <>
      <QuantityField
        label="Seam mass per length"
        value={seams.massPerMetre}
        quantity="massPerMetre"
        units={units}
        hint="Tape, overlap, weld"
        onCommit={(massPerMetre, run) =>
          commit(setHull('seam mass', { seams: { ...seams, massPerMetre } }), run)
        }
      />
      {counted && (
        <CountField
          label="Seams"
          value={seams.count}
          hint="Nose to tail"
          onCommit={(count) => commit(setHull('seams', { seams: { ...seams, count } }))}
        />
      )}
    </>
  );
}
