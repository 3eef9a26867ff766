/** Yes or no; or, for parts that differ, neither. */
import { useId } from 'react';

export interface CheckFieldProps {
  readonly label: string;
  readonly value: boolean | null;
  onCommit(value: boolean): void;
}

export function CheckField({ label, value, onCommit }: CheckFieldProps) {
  const id = useId();
  return (
    <div className="field field-check">
      <input
        id={id}
        type="checkbox"
        checked={value ?? false}
        ref={(box) => {
          if (box) box.indeterminate = value === null;
        }}
        onChange={(event) => onCommit(event.currentTarget.checked)}
      />
      <label htmlFor={id}>{label}</label>
    </div>
  );
}
