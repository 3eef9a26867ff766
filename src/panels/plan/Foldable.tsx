/** A part of a panel that stays folded until it is wanted. */
import type { ReactNode } from 'react';

export interface FoldableProps {
  readonly title: string;
  /** Said beside the title, for when it is folded. */
  readonly note: string;
  /** Whether it is open at first, by default not. */
  readonly open?: boolean;
  readonly children: ReactNode;
}

export function Foldable({ title, note, open, children }: FoldableProps) {
  return (
    <details className="foldable" open={open}>
      <summary>
        <h3>{title}</h3>
        {note && <span className="aside">{note}</span>}
      </summary>
      <div className="foldable-body">{children}</div>
    </details>
  );
}
