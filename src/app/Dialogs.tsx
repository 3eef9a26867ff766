/** Whichever dialog is open. */
import { ProblemsList } from '../panels/ProblemsList.tsx';
import { useCell } from './cell.ts';
import { Dialog } from './Dialog.tsx';
import { KeysDialog } from './KeysDialog.tsx';
import type { Store } from './store.ts';

export function Dialogs({ store }: { store: Store }) {
  const open = useCell(store.dialog);
  const refusal = useCell(store.refusal);
  const close = () => store.dialog.set(null);
  if (refusal) {
    return (
      <Dialog title="Not opened" onClose={() => store.refusal.set(null)}>
        <ProblemsList
          title={`${refusal.name} is not a craft file as it stands`}
          problems={refusal.problems}
        />
        <p>The craft you had stays as it was. Mend the file and open it again.</p>
      </Dialog>
    );
  }
  switch (open) {
    case 'keys':
      return <KeysDialog onClose={close} />;
    default:
      return null;
  }
}
