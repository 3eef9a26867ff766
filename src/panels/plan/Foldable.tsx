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

/** Which are open, by title, as the builder last left them: another tab in front takes them off the page. */
const left = new Map<string, boolean>();

/** Each title stands for one part, wherever it is. */
export function Foldable({ title, note, open, children }: FoldableProps) {
  return (
    <details
      className="foldable"
      open={left.get(title) ?? open}
      onToggle={({ currentTarget }) => left.set(title, currentTarget.open)}
    >
      <summary>
        <h3>{title}</h3>
        {note && <span className="aside">{note}</span>}
      </summary>
      <div className="foldable-body">{children}</div>
    </details>
  );
}
