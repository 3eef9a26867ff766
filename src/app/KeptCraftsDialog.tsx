/** The crafts dialog, joined to the keep. */
import { useCallback, useEffect, useState } from 'react';
import { type CraftEntry, CraftsDialog, type SampleEntry } from '../panels/CraftsDialog.tsx';
import { craftEntries, duplicateKept, renameKept } from './keptCrafts.ts';
import { openAfresh, openKept } from './openings.ts';
import { sampleEntries, sampleText } from './samples.ts';
import type { Store } from './store.ts';

export function KeptCraftsDialog({ store, onClose }: { store: Store; onClose: () => void }) {
  const [crafts, setCrafts] = useState<readonly CraftEntry[]>([]);
  const [samples, setSamples] = useState<readonly SampleEntry[]>([]);
  const refresh = useCallback(() => void craftEntries(store).then(setCrafts, () => {}), [store]);
  useEffect(refresh, [refresh]);
  useEffect(() => void sampleEntries().then(setSamples, () => {}), []);
  const leaveFor = (opening: Promise<unknown>) => {
    onClose();
    opening.catch(() => store.notices.add('It could not be opened.', 'bad'));
  };
  const change = (changing: Promise<unknown>) =>
    changing.catch(() => store.notices.add('This browser could not keep that change.', 'bad')).then(refresh);
  return (
    <CraftsDialog
      crafts={crafts}
      samples={samples}
      onOpen={(id) => leaveFor(openKept(store, id))}
      onOpenVersion={(id, index) => leaveFor(openVersion(store, id, index))}
      onRename={(id, name) => change(renameKept(store, id, name))}
      onDuplicate={(id) => change(duplicateKept(store, id))}
      onDelete={(id) => change(store.keep.remove(id))}
      onSample={(id) => leaveFor(sampleText(id).then((text) => openAfresh(store, text, id)))}
      onNew={() => store.dialog.set('newCraft')}
      onClose={onClose}
    />
  );
}

/** As a craft of its own, so that neither it nor what came after is lost. */
async function openVersion(store: Store, id: string, index: number): Promise<void> {
  const version = (await store.keep.versions(id))[index];
  if (version) await openAfresh(store, version.text, version.name);
}
