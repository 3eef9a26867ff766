/** A modal dialog: the browser's own, so that focus, Escape and the backdrop are its business. */
import { type ReactNode, useEffect, useId, useRef } from 'react';
import './dialogs.css';

export interface DialogFrameProps {
  readonly title: string;
  onClose(): void;
  readonly children: ReactNode;
}

export function DialogFrame({ title, onClose, children }: DialogFrameProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const heading = useId();
  useEffect(() => {
    const dialog = ref.current!;
    dialog.showModal();
    // What is to be typed comes first; without such a field the browser's own choice stands.
    dialog.querySelector<HTMLElement>('form input, textarea, [type=search]')?.focus();
    return () => dialog.close();
  }, []);
  return (
    <dialog ref={ref} className="dialog" aria-labelledby={heading} onClose={onClose}>
      <div className="dialog-head">
        <h2 id={heading}>{title}</h2>
        <button type="button" onClick={onClose}>
          Close
        </button>
      </div>
      {children}
    </dialog>
  );
}
