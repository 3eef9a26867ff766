/** A caution, standing where the hazard is. */
import type { ReactNode } from 'react';
import type { PartKind } from '../craft/schema.ts';
import { partHazard } from '../report/hazards.ts';

export function Caution({ children }: { children: ReactNode }) {
  return (
    <p className="caution" role="note">
      <strong>Caution:</strong> {children}
    </p>
  );
}

/** What to mind about parts of this kind; nothing for most. */
export function PartCaution({ kind }: { kind: PartKind }) {
  const text = partHazard(kind);
  return text ? <Caution>{text}</Caution> : null;
}
