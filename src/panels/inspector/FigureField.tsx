/** A field of one number among several figures that belong together. */
import type { Problem } from '../../craft/problem.ts';
import type { Quantity } from '../../units/units.ts';
import { useEditor } from '../editor.ts';
import { QuantityField } from '../fields/QuantityField.tsx';

/** Hands in what changed; `field` names it for the undo button. */
export type SetFigures<T> = (field: string, change: Partial<T>, run?: string) => Problem | null;

type NumberKey<T> = { [K in keyof T]: T[K] extends number ? K : never }[keyof T];

interface FigureFieldProps<T, K extends NumberKey<T>> {
  readonly figures: T;
  readonly name: K;
  readonly label: string;
  readonly quantity: Quantity;
  readonly hint?: string;
  readonly set: SetFigures<T>;
}

export function FigureField<T, K extends NumberKey<T>>(props: FigureFieldProps<T, K>) {
  const { figures, name, label, quantity, hint, set } = props;
  const { units } = useEditor();
  return (
    <QuantityField
      label={label}
      value={figures[name] as number}
      quantity={quantity}
      units={units}
      hint={hint}
      onCommit={(next, run) => set(label.toLowerCase(), { [name]: next } as unknown as Partial<T>, run)}
    />
  );
}
