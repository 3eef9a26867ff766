/** The ledger: tables of parts, wire runs and hardpoints, each with what can be done to its rows. */
import { useState } from 'react';
import { CatalogueDialog } from './CatalogueDialog.tsx';
import { useEditor } from './editor.ts';
import { HardpointTable } from './ledger/HardpointTable.tsx';
import { type LedgerDialog, PartTable } from './ledger/PartTable.tsx';
import { WireTable } from './ledger/WireTable.tsx';
import { PasteRowsDialog } from './PasteRowsDialog.tsx';
import { type Tab, Tabs } from './Tabs.tsx';
import { WeighDialog } from './WeighDialog.tsx';
import './ledger/ledger.css';

type TabId = 'parts' | 'wires' | 'hardpoints';

export function Ledger() {
  const { craft } = useEditor();
  const [front, setFront] = useState<TabId>('parts');
  const [dialog, setDialog] = useState<LedgerDialog | null>(null);
  const tabs: readonly Tab<TabId>[] = [
    { id: 'parts', title: `Parts (${craft.parts.order.length})` },
    { id: 'wires', title: `Wires (${craft.wires.order.length})` },
    { id: 'hardpoints', title: `Hardpoints (${craft.hardpoints.order.length})` },
  ];
  return (
    <section className="ledger" aria-label="Ledger">
      <div className="ledger-frame">
        <Tabs<TabId> label="Ledger" body="ledger-body" tabs={tabs} front={front} onFront={setFront}>
          {front === 'parts' && <PartTable onDialog={setDialog} />}
          {front === 'wires' && <WireTable />}
          {front === 'hardpoints' && <HardpointTable />}
        </Tabs>
      </div>
      {dialog && <OpenDialog dialog={dialog} onClose={() => setDialog(null)} />}
    </section>
  );
}

function OpenDialog({ dialog, onClose }: { dialog: LedgerDialog; onClose: () => void }) {
  switch (dialog.kind) {
    case 'catalogue':
      return <CatalogueDialog onClose={onClose} />;
    case 'paste':
      return <PasteRowsDialog text={dialog.text} onClose={onClose} />;
    case 'weigh':
      return <WeighDialog id={dialog.id} onClose={onClose} />;
  }
}
