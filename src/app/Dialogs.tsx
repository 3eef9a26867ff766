/** Whichever dialog is open. */
import { DialogFrame } from '../panels/DialogFrame.tsx';
import { NewCraftDialog } from '../panels/NewCraftDialog.tsx';
import { PasteRowsDialog } from '../panels/PasteRowsDialog.tsx';
import { ProblemsList } from '../panels/ProblemsList.tsx';
import { useCell } from './cell.ts';
import { KeptCraftsDialog } from './KeptCraftsDialog.tsx';
import { KeysDialog } from './KeysDialog.tsx';
import type { Refusal, Store } from './store.ts';

export function Dialogs({ store }: { store: Store }) {
  const open = useCell(store.dialog);
  const refusal = useCell(store.refusal);
  const table = useCell(store.table);
  const close = () => store.dialog.set(null);
  if (refusal) return <RefusalDialog refusal={refusal} onClose={() => store.refusal.set(null)} />;
  if (table !== null) return <PasteRowsDialog text={table} onClose={() => store.table.set(null)} />;
  switch (open) {
    case 'keys':
      return <KeysDialog onClose={close} />;
    case 'crafts':
      return <KeptCraftsDialog store={store} onClose={close} />;
    case 'newCraft': {
      const create = (craft: Parameters<Store['start']>[0]) => {
        close();
        store.start(craft);
        // After the dialog has gone and given the focus back to its button.
        requestAnimationFrame(focusSideView);
      };
      return <NewCraftDialog onCreate={create} onClose={close} />;
    }
    case null:
      return null;
  }
}

const focusSideView = () => document.querySelector<HTMLElement>('[data-testid=side-view]')?.focus();

const RefusalDialog = ({
  refusal: { name, problems },
  onClose,
}: {
  refusal: Refusal;
  onClose: () => void;
}) => (
  <DialogFrame title="Not opened" onClose={onClose}>
    <ProblemsList title={`${name} is not a craft file as it stands`} problems={problems} />
    <p>The craft you had stays as it was. Mend the file and open it again.</p>
  </DialogFrame>
);
