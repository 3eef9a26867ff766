/** How many pieces a part has and how they stand. */
import type { Problem } from '../../craft/problem.ts';
import type { Copies } from '../../craft/schema.ts';
import { ChoiceField } from '../fields/ChoiceField.tsx';
import { CountField } from '../fields/CountField.tsx';
import { COPIES_CHOICES } from '../words.ts';

export interface CopiesFieldProps {
  readonly copies: Copies;
  onCommit(copies: Copies): Problem | null;
}

const FEWEST: Readonly<Record<Copies['kind'], Copies>> = {
  together: { kind: 'together', count: 1 },
  pair: { kind: 'pair' },
  ring: { kind: 'ring', count: 3 },
};

export function CopiesField({ copies, onCommit }: CopiesFieldProps) {
  return (
    <>
      <ChoiceField
        label="Copies"
        value={copies.kind}
        choices={COPIES_CHOICES}
        onCommit={(kind) => onCommit(FEWEST[kind])}
      />
      {copies.kind !== 'pair' && (
        <CountField
          label="Number of copies"
          value={copies.count}
          onCommit={(count) => onCommit({ ...copies, count })}
        />
      )}
    </>
  );
}
