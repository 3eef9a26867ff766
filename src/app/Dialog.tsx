/** A modal dialog: the browser's own, so that focus, Escape and the backdrop are its business. */
import { type ReactNode, useEffect, useId, useRef } from 'react';
import { Icon } from './Icon.tsx';

interface DialogProps {
  readonly title: string;
  readonly onClose: () => void;
  readonly children: ReactNode;
}

export function Dialog({ title, onClose, children }: DialogProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const heading = useId();
  useEffect(() => {
    const dialog = ref.current!;
    dialog.showModal();
    return () => dialog.close();
  }, []);
  return (
    <dialog ref={ref} className="dialog" aria-labelledby={heading} onClose={onClose}>
      <div className="dialog-head">
        <h2 id={heading}>{title}</h2>
        <button type="button" className="command terse" aria-label="Close" onClick={onClose}>
          <Icon name="close" />
        </button>
      </div>
      {children}
    </dialog>
  );
}
