/** What the drawing is given of the placement study while the turn is in front. */
import { moveThruster } from '../edit/edits/moveThruster.ts';
import type { Editor } from '../panels/editor.ts';
import { holdsFor, pointNow } from '../panels/turn/studyCraft.ts';
import { useStudying } from '../panels/turn/studying.ts';
import { useTurning } from '../panels/turn/turning.ts';
import type { PlacedPoint } from '../report/turning/studies.ts';
import type { StudyToDraw } from '../scene/placePlot.ts';
import { inUnits } from '../units/sentence.ts';
import type { UnitSystem } from '../units/units.ts';

export interface StudyDrawn {
  readonly study: StudyToDraw;
  readonly fresh: boolean;
  readonly marked: number | null;
  readonly name: string;
  /** m */
  readonly length: number;
  readonly onMoveTo: (station: number) => void;
}

/** "There the propeller would strike Gondola. Drag it there, or type its station, if that is what you want." */
function struckThere({ cautions }: PlacedPoint, units: UnitSystem): string {
  const [first = ''] = cautions;
  const matter = inUnits(`${first.charAt(0).toLowerCase()}${first.slice(1)}`, units);
  return `There ${matter} Drag it there, or type its station, if that is what you want.`;
}

/** Null while there is none to show. */
export function useStudyDrawn(editor: Editor, inFront: boolean): StudyDrawn | null {
  const studying = useStudying();
  const turning = useTurning();
  const { craft, assessment } = editor;
  const { geometry } = assessment;
  const part = craft.parts.byId[studying.part ?? ''];
  if (!inFront || !part || geometry.status !== 'solved') return null;
  const { points, complete } = studying;
  return {
    study: { points, complete, today: pointNow(studying, craft) },
    fresh: holdsFor(studying, craft, turning),
    marked: turning.marked,
    name: part.name || 'the thruster',
    length: geometry.hull.length,
    onMoveTo: (station) => {
      const point = points.find((each) => each.station === station);
      if (!point) return;
      if (part.locked) editor.notify(`${part.name || 'It'} is locked. Unlock it to move it.`);
      else if (point.strikes) editor.notify(struckThere(point, editor.units));
      else editor.apply(moveThruster(part, point.place));
    },
  };
}
