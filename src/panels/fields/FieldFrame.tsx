/** The label, unit and error sentence around one input. */
import { type ReactNode, useId } from 'react';
import { ErrorBubble } from './ErrorBubble.tsx';

/** What the input inside must carry so that label, unit and error belong to it. */
export interface InputAria {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
  /** Only where no label is shown. */
  readonly 'aria-label': string | undefined;
}

export interface FieldFrameProps {
  readonly label: string;
  /** In a table the column heads label the eye; the label is then spoken only. */
  readonly bare?: boolean | undefined;
  readonly unit?: string | undefined;
  readonly error?: string | null | undefined;
  readonly hint?: string | undefined;
  children(aria: InputAria): ReactNode;
}

export function FieldFrame({ label, bare, unit, error, hint, children }: FieldFrameProps) {
  const id = useId();
  const described = [unit && `${id}-unit`, hint && `${id}-hint`, error && `${id}-error`].filter(Boolean);
  const input = children({
    id,
    'aria-describedby': described.length ? described.join(' ') : undefined,
    'aria-invalid': error ? true : undefined,
    'aria-label': bare ? label : undefined,
  });
  return (
    <div className={bare ? 'field field-bare' : 'field'}>
      {!bare && (
        <label className="field-label" htmlFor={id}>
          {label}
        </label>
      )}
      <span className="field-input">
        {input}
        {unit && (
          <span className="field-unit" id={`${id}-unit`}>
            {unit}
          </span>
        )}
      </span>
      {hint && (
        <span className="field-hint" id={`${id}-hint`}>
          {hint}
        </span>
      )}
      {error && (
        <ErrorText id={`${id}-error`} floating={bare}>
          {error}
        </ErrorText>
      )}
    </div>
  );
}

/** In a table there is no room under the input, so the sentence floats over what stands there. */
function ErrorText({
  id,
  floating,
  children,
}: {
  id: string;
  floating?: boolean | undefined;
  children: string;
}) {
  if (floating) return <ErrorBubble id={id}>{children}</ErrorBubble>;
  return (
    <span className="field-error" id={id} role="alert">
      {children}
    </span>
  );
}
