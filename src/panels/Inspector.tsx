/** Every field of what is selected. */
import type { ReactNode } from 'react';
import { idsOf } from '../edit/selection.ts';
import { useEditor } from './editor.ts';
import { HardpointInspector } from './inspector/HardpointInspector.tsx';
import { PartInspector } from './inspector/PartInspector.tsx';
import { PartsInspector } from './inspector/PartsInspector.tsx';
import { WireInspector } from './inspector/WireInspector.tsx';

export function Inspector() {
  const { craft, selection } = useEditor();
  const parts = idsOf(selection, 'part').flatMap((id) => craft.parts.byId[id] ?? []);
  if (parts.length > 1) {
    return (
      <FromTop key={parts.map((part) => part.id).join(' ')}>
        <PartsInspector parts={parts} />
      </FromTop>
    );
  }
  const last = selection.at(-1);
  if (!last) return <NothingSelected />;
  // The key gives each thing its own fields, so that a text half typed for one never lands in another.
  const key = `${last.kind} ${last.id}`;
  switch (last.kind) {
    case 'part':
      return (
        <FromTop key={key}>
          <PartInspector part={craft.parts.byId[last.id]!} />
        </FromTop>
      );
    case 'wire':
      return (
        <FromTop key={key}>
          <WireInspector wire={craft.wires.byId[last.id]!} />
        </FromTop>
      );
    case 'hardpoint':
      return (
        <FromTop key={key}>
          <HardpointInspector hardpoint={craft.hardpoints.byId[last.id]!} />
        </FromTop>
      );
  }
}

/** What is newly selected is read from its name down, wherever the one before was scrolled to. */
function FromTop({ children }: { children: ReactNode }) {
  return <div ref={scrollUp}>{children}</div>;
}

/** Called once, as the thing comes onto the page. */
const scrollUp = (element: HTMLElement | null): void =>
  element?.closest('[role="tabpanel"]')?.scrollTo({ top: 0 });

function NothingSelected() {
  return (
    <section className="panel inspector" aria-label="Inspector">
      <p className="aside">
        Nothing is selected. Pick a part, a wire run or a hardpoint in the drawing or in the ledger to see all
        its fields.
      </p>
    </section>
  );
}
