/** A number with its unit: SI outside, the builder's unit on screen. Takes sums and other units as typed. */
import type { KeyboardEvent } from 'react';
import type { Problem } from '../../craft/problem.ts';
import { type Quantity, type UnitSystem, unitOf } from '../../units/units.ts';
import { entryText, problemSentence, readEntry, readOptional, stepped } from './entry.ts';
import { FieldFrame } from './FieldFrame.tsx';
import { useBurst } from './useBurst.ts';
import { type Leave, useDraft } from './useDraft.ts';

export interface QuantityFieldProps {
  readonly label: string;
  /** SI; null where there is none yet. */
  readonly value: number | null;
  readonly quantity: Quantity;
  readonly units: UnitSystem;
  /** `run`: the burst of arrow keys it belongs to. */
  onCommit(value: number, run?: string): Problem | null;
  /** Takes the value away when the field is emptied. Without it something has to stand there. */
  onClear?: (() => Problem | null) | undefined;
  /** What stands there, faintly, while there is no value. */
  readonly empty?: string | undefined;
  /** Not kept as typed but worked out from what is: shown as figures are. */
  readonly derived?: boolean | undefined;
  readonly bare?: boolean | undefined;
  readonly hint?: string | undefined;
  readonly disabled?: boolean | undefined;
  readonly autoFocus?: boolean | undefined;
  readonly startWith?: string | undefined;
  readonly onLeave?: ((how: Leave) => void) | undefined;
}

export function QuantityField(props: QuantityFieldProps) {
  const { label, value, quantity, units, onCommit, onClear, startWith, onLeave } = props;
  const burst = useBurst();
  const hand = (next: number | null, stepped?: boolean): Problem | null => {
    if (next === null) return onClear?.() ?? null;
    return stepped ? onCommit(next, burst.run()) : onCommit(next);
  };
  const draft = useDraft<number | null>({
    label,
    shown: value === null ? '' : entryText(value, quantity, units, props.derived ? 0 : 2),
    read: (text) => (onClear ? readOptional : readEntry)(text, quantity, units),
    commit: (next, text, stepped) => {
      const problem = next === value ? null : hand(next, stepped);
      return problem && problemSentence(label, text, problem, quantity, units);
    },
    startWith,
    onLeave,
  });
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    draft.onKeyDown(event);
    const steps = stepsOf(event);
    const now = steps === 0 ? null : readEntry(draft.text, quantity, units);
    if (!now?.ok) return;
    event.preventDefault();
    event.stopPropagation();
    const next = stepped(now.value, steps, quantity, units);
    draft.replace(entryText(next, quantity, units), next);
  };
  return (
    <FieldFrame
      label={label}
      unit={unitOf(quantity, units).symbol}
      error={draft.error}
      bare={props.bare}
      hint={props.hint}
    >
      {(aria) => (
        <input
          {...aria}
          ref={draft.hold}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          className="number"
          value={draft.text}
          placeholder={props.empty}
          disabled={props.disabled}
          // biome-ignore lint/a11y/noAutofocus: only where the builder just opened this cell to type
          autoFocus={props.autoFocus}
          onFocus={(event) => startWith === undefined && event.currentTarget.select()}
          onChange={(event) => draft.set(event.currentTarget.value)}
          onBlur={() => {
            burst.end();
            draft.onBlur();
          }}
          onKeyDown={onKeyDown}
        />
      )}
    </FieldFrame>
  );
}

function stepsOf({ key, shiftKey, altKey, ctrlKey, metaKey }: KeyboardEvent): number {
  if (altKey || ctrlKey || metaKey) return 0;
  const size = shiftKey ? 10 : 1;
  return key === 'ArrowUp' ? size : key === 'ArrowDown' ? -size : 0;
}
