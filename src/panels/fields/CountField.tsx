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
  readonly startWith?: string | undefined;
  readonly onLeave?: ((how: Leave) => void) | undefined;
}

export function CountField({ label, value, onCommit, bare, hint, startWith, onLeave }: CountFieldProps) {
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
          type="text"
          inputMode="numeric"
          autoComplete="off"
          className="number"
          value={draft.text}
          onChange={(event) => draft.set(event.currentTarget.value)}
          onBlur={draft.onBlur}
          onKeyDown={draft.onKeyDown}
        />
      )}
    </FieldFrame>
  );
}
