/** A part of a panel that stays folded until it is wanted. */
import type { ReactNode } from 'react';

export interface FoldableProps {
  readonly title: string;
  /** Said beside the title, for when it is folded. */
  readonly note: string;
  readonly children: ReactNode;
}

export function Foldable({ title, note, children }: FoldableProps) {
  return (
    <details className="foldable">
      <summary>
        <h3>{title}</h3>
        {note && <span className="aside">{note}</span>}
      </summary>
      <div className="foldable-body">{children}</div>
    </details>
  );
}
