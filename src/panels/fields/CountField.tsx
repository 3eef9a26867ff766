/** A whole number. */
import type { Problem } from '../../craft/problem.ts';
import { problemSentence, readCount } from './entry.ts';
import { FieldFrame } from './FieldFrame.tsx';
import { type Leave, useDraft } from './useDraft.ts';

export interface CountFieldProps {
  readonly label: string;
  readonly value: number;
  onCommit(value: number): Problem | null;
  readonly bare?: boolean | undefined;
  readonly hint?: string | undefined;
  readonly autoFocus?: boolean | undefined;
  readonly startWith?: string | undefined;
  readonly onLeave?: ((how: Leave) => void) | undefined;
}

export function CountField(props: CountFieldProps) {
  const { label, value, onCommit, bare, hint, autoFocus, startWith, onLeave } = props;
  const draft = useDraft<number>({
    label,
    shown: String(value),
    read: readCount,
    commit: (next, text) => {
      const problem = next === value ? null : onCommit(next);
      return problem && problemSentence(label, text, problem, null, 'metric');
    },
    startWith,
    onLeave,
  });
  return (
    <FieldFrame label={label} error={draft.error} bare={bare} hint={hint}>
      {(aria) => (
        <input
          {...aria}
          ref={draft.hold}
          type="text"
          inputMode="numeric"
          autoComplete="off"
          className="number"
          value={draft.text}
          // biome-ignore lint/a11y/noAutofocus: only where the builder just opened this cell to type
          autoFocus={autoFocus}
          onFocus={(event) => bare && startWith === undefined && event.currentTarget.select()}
          onChange={(event) => draft.set(event.currentTarget.value)}
          onBlur={draft.onBlur}
          onKeyDown={draft.onKeyDown}
        />
      )}
    </FieldFrame>
  );
}
