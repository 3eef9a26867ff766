/** The craft's name and the builder's notes. */
import { setName, setNotes } from '../edit/edits/craft.ts';
import { HAZARDS } from '../report/hazards.ts';
import { Caution } from './Caution.tsx';
import { useCommit } from './commit.ts';
import { useEditor } from './editor.ts';
import { NotesField } from './fields/NotesField.tsx';
import { TextField } from './fields/TextField.tsx';

export function NotesPanel() {
  const { craft } = useEditor();
  const commit = useCommit();
  return (
    <section className="panel" aria-label="Notes">
      <TextField label="Craft name" value={craft.name} onCommit={(name) => commit(setName(name))} />
      <NotesField
        label="Notes"
        rows={14}
        value={craft.notes}
        onCommit={(notes, run) => commit(setNotes(notes), run)}
      />
      <FlightCaution />
    </section>
  );
}

/** What to mind before it flies. */
export const FlightCaution = () => <Caution>{HAZARDS.people}</Caution>;
