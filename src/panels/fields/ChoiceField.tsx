/** One of a few. */
import { useRef, useState } from 'react';
import type { Problem } from '../../craft/problem.ts';
import type { Choice } from '../words.ts';
import { FieldFrame } from './FieldFrame.tsx';
import type { Leave } from './useDraft.ts';

export interface ChoiceFieldProps<T extends string> {
  readonly label: string;
  /** Null where none of the choices holds, as for parts that differ. */
  readonly value: T | null;
  readonly choices: readonly Choice<T>[];
  onCommit(value: T): Problem | null;
  /** What stands there when none holds. */
  readonly none?: string | undefined;
  readonly bare?: boolean | undefined;
  readonly hint?: string | undefined;
  readonly autoFocus?: boolean | undefined;
  readonly onLeave?: ((how: Leave) => void) | undefined;
}

export function ChoiceField<T extends string>(props: ChoiceFieldProps<T>) {
  const { label, value, choices, onCommit, none = 'Choose…', bare, hint, onLeave } = props;
  const [error, setError] = useState<string | null>(null);
  /** What Escape goes back to: an arrow key in a closed list chooses at once. */
  const first = useRef(value);
  const choose = (text: string) => {
    const chosen = choices.find((choice) => choice.value === text);
    if (!chosen || chosen.value === value) return;
    const problem = onCommit(chosen.value);
    setError(problem && `${label}: ${chosen.label} cannot be taken; allowed: ${problem.allowed}.`);
  };
  return (
    <FieldFrame label={label} error={error} bare={bare} hint={hint}>
      {(aria) => (
        <select
          {...aria}
          value={value ?? ''}
          // biome-ignore lint/a11y/noAutofocus: only where the builder just opened this cell
          autoFocus={props.autoFocus}
          onChange={(event) => choose(event.currentTarget.value)}
          onBlur={() => onLeave?.('blur')}
          onKeyDown={(event) => {
            if (onLeave && (event.key === 'Enter' || event.key === 'Escape')) {
              event.preventDefault();
              event.stopPropagation();
              if (event.key === 'Escape' && first.current !== null) choose(first.current);
              onLeave(event.key === 'Enter' ? 'enter' : 'escape');
            }
          }}
        >
          {value === null && <option value="">{none}</option>}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
        </select>
      )}
    </FieldFrame>
  );
}
