/** One line of text. */
import type { Problem } from '../../craft/problem.ts';
import { problemSentence, type Read } from './entry.ts';
import { FieldFrame } from './FieldFrame.tsx';
import { type Leave, useDraft } from './useDraft.ts';

export interface TextFieldProps {
  readonly label: string;
  readonly value: string;
  onCommit(value: string): Problem | null;
  readonly bare?: boolean | undefined;
  readonly hint?: string | undefined;
  readonly autoFocus?: boolean | undefined;
  readonly startWith?: string | undefined;
  readonly onLeave?: ((how: Leave) => void) | undefined;
}

const asTyped = (text: string): Read<string> => ({ ok: true, value: text.trim() });

export function TextField({
  label,
  value,
  onCommit,
  bare,
  hint,
  autoFocus,
  startWith,
  onLeave,
}: TextFieldProps) {
  const draft = useDraft<string>({
    label,
    shown: value,
    read: asTyped,
    commit: (next, text) => {
      const problem = next === value ? null : onCommit(next);
      return problem && problemSentence(label, text.slice(0, 40), problem, null, 'metric');
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
          autoComplete="off"
          value={draft.text}
          // biome-ignore lint/a11y/noAutofocus: only where the builder just opened this cell or dialog to type
          autoFocus={autoFocus}
          onFocus={(event) => startWith === undefined && event.currentTarget.select()}
          onChange={(event) => draft.set(event.currentTarget.value)}
          onBlur={draft.onBlur}
          onKeyDown={draft.onKeyDown}
        />
      )}
    </FieldFrame>
  );
}
