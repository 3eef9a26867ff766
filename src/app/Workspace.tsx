/** The drawing with the beam under it, the ledger below, and one column of panels; the bars between can be moved. */
import { useState } from 'react';
import type { Editor } from '../panels/editor.ts';
import { Ledger } from '../panels/Ledger.tsx';
import { Verdicts } from '../panels/Verdicts.tsx';
import type { Palette } from '../scene/palette.ts';
import { Drawing } from './Drawing.tsx';
import { SideColumn } from './SideColumn.tsx';
import { Splitter } from './Splitter.tsx';
import type { Store } from './store.ts';

interface WorkspaceProps {
  readonly store: Store;
  readonly editor: Editor;
  readonly palette: Palette;
}

const COLUMN = { least: 260, usual: innerWidth < 1200 ? 340 : 362 };
/** A finger needs taller rows; a small page has no more to give, or the drawing gets too small. */
const LEDGER_SHARE = innerWidth < 1200 ? 0.26 : matchMedia('(pointer: coarse)').matches ? 0.3 : 0.24;
const LEDGER = { least: 96, usual: Math.round(innerHeight * LEDGER_SHARE) };

export function Workspace({ store, editor, palette }: WorkspaceProps) {
  const [column, setColumn] = useState(COLUMN.usual);
  const [ledger, setLedger] = useState(LEDGER.usual);
  return (
    <main className="workspace" style={{ gridTemplateColumns: `minmax(0, 1fr) auto ${column}px` }}>
      <div className="desk" style={{ gridTemplateRows: `auto minmax(0, 1fr) auto ${ledger}px` }}>
        <Verdicts />
        <Drawing store={store} editor={editor} palette={palette} />
        <Splitter
          label="Height of the ledger"
          orientation="horizontal"
          size={ledger}
          most={Math.round(innerHeight * 0.6)}
          {...LEDGER}
          onSize={setLedger}
        />
        <div className="ledger-pane" hidden={ledger === 0}>
          <Ledger />
        </div>
      </div>
      <Splitter
        label="Width of the panels"
        orientation="vertical"
        size={column}
        most={Math.round(innerWidth * 0.5)}
        {...COLUMN}
        onSize={setColumn}
      />
      <SideColumn store={store} palette={palette} hidden={column === 0} />
    </main>
  );
}
