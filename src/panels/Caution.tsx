/** A caution, standing where the hazard is. */
import type { ReactNode } from 'react';
import type { PartKind } from '../craft/schema.ts';

export function Caution({ children }: { children: ReactNode }) {
  return (
    <p className="caution" role="note">
      <strong>Caution:</strong> {children}
    </p>
  );
}

const PART_CAUTIONS: Partial<Record<PartKind, string>> = {
  battery:
    'Lithium cells burn when crushed, pierced, overcharged or shorted. Charge them watched and away from the hull, and follow the maker’s sheet.',
  thruster:
    'A turning propeller cuts and catches hair and cords. Take the propeller off or the battery out before you work on the craft, and guard it near people.',
  ballast:
    'Lead is poisonous: wash your hands after touching it, and fix it so that it cannot fall on anybody.',
};

/** What to mind about parts of this kind; nothing for most. */
export function PartCaution({ kind }: { kind: PartKind }) {
  const text = PART_CAUTIONS[kind];
  return text ? <Caution>{text}</Caution> : null;
}
