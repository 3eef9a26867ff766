/** Where things are; while a hull cannot be formed (in the middle of typing, say), where they were last. */
import { useRef } from 'react';
import { type Geometry, geometryOf, type Subject } from '../scene/subject.ts';

export function useGeometry({ assessment }: Pick<Subject, 'assessment'>): {
  geometry: Geometry | null;
  /** Why what is drawn is not the craft as it stands; null when it is. */
  stale: string | null;
} {
  const last = useRef<Geometry | null>(null);
  const now = geometryOf(assessment);
  last.current = now ?? last.current;
  const { geometry } = assessment;
  const why =
    geometry.status === 'infeasible' ? [geometry.why, geometry.remedy].filter(Boolean).join(' ') : null;
  return { geometry: last.current, stale: why };
}
