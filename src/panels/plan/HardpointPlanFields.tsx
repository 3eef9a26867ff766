/** What the plan may hang at a hardpoint. */
import type { Fill } from '../../craft/planningSchema.ts';
import type { Hardpoint } from '../../craft/schema.ts';
import { setHardpoint } from '../../edit/edits/hardpoints.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { QuantityField } from '../fields/QuantityField.tsx';
import { FILL_CHOICES } from './fillWords.ts';

export function HardpointPlanFields({ hardpoint }: { hardpoint: Hardpoint }) {
  const { units } = useEditor();
  const commit = useCommit();
  return (
    <>
      <QuantityField
        label="Holds at most"
        value={hardpoint.limit}
        quantity="mass"
        units={units}
        hint="Lead and loads together"
        onCommit={(limit, run) => commit(setHardpoint(hardpoint, 'limit', { limit }), run)}
      />
      <ChoiceField<Fill>
        label="Lead comes"
        value={hardpoint.fill}
        choices={FILL_CHOICES}
        onCommit={(fill) => commit(setHardpoint(hardpoint, 'fill', { fill }))}
      />
    </>
  );
}
