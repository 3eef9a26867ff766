/** Many lines of text, taken with every keystroke so that nothing typed is lost. */
import { useState } from 'react';
import type { Problem } from '../../craft/problem.ts';
import { FieldFrame } from './FieldFrame.tsx';
import { useBurst } from './useBurst.ts';

export interface NotesFieldProps {
  readonly label: string;
  readonly value: string;
  readonly rows: number;
  /** `run`: the burst of keystrokes it belongs to. */
  onCommit(value: string, run: string): Problem | null;
}

export function NotesField({ label, value, rows, onCommit }: NotesFieldProps) {
  /** Text the craft would not take, with what is allowed. */
  const [refused, setRefused] = useState<{ text: string; allowed: string } | null>(null);
  const burst = useBurst();
  const change = (text: string) => {
    const problem = onCommit(text, burst.run());
    setRefused(problem && { text, allowed: problem.allowed });
  };
  const error = refused && `${label}: found ${refused.text.length} characters; allowed: ${refused.allowed}.`;
  return (
    <FieldFrame label={label} error={error}>
      {(aria) => (
        <textarea
          {...aria}
          rows={rows}
          onBlur={burst.end}
          value={refused?.text ?? value}
          onChange={(event) => change(event.currentTarget.value)}
        />
      )}
    </FieldFrame>
  );
}
