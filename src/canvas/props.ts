/** What the page hands to every view. */
import type { Selection } from '../edit/selection.ts';
import type { Session } from '../edit/session.ts';
import type { CarrySubject, PlanSubject } from '../scene/planned.ts';
import type { Geometry, Subject } from '../scene/subject.ts';
import type { ViewState } from './useView.ts';

export interface CanvasProps extends Subject {
  readonly session: Session;
  readonly selection: Selection;
  /** Drawn in the attitude in which it floats, or level. */
  readonly tilted: boolean;
  /** Whether what is dragged snaps, by default true; Alt turns it round. */
  readonly snap?: boolean;
  /** Whether a click adds to the selection and a drag on empty ground draws a box, by default false. */
  readonly several?: boolean;
  /** Whether the turn is in front: thrust is then drawn of every thruster, by default only where a hand or the pointer is. */
  readonly turning?: boolean;
}

/** The side view and the beam share one view state, so that stations lie under each other. */
export interface SharedProps extends CanvasProps, PlanSubject, CarrySubject {
  readonly viewState: ViewState;
}

/** Once there is a hull to draw. */
export interface DrawnProps extends CanvasProps {
  readonly geometry: Geometry;
}
