/** What the notes over a view say of the thing under the pointer, and what they must not cover. */
import { aboutGrip } from '../scene/about.ts';
import { type InSight, rectsAlong } from '../scene/clearSpot.ts';
import { type Grip, handlesOf } from '../scene/grip.ts';
import { type BalanceMarks, marksTaken } from '../scene/marks.ts';
import { around, type Rect, screenBox } from '../scene/rect.ts';
import { type PlanePoint, toScreen } from '../scene/view.ts';
import type { Scene } from './gestures/gesture.ts';
import type { NotesProps } from './Notes.tsx';
import type { Overlay } from './overlay.ts';

const REACH = 8;

export function thingUnder(scene: Scene, { held, hover, hoverAt }: Overlay): NotesProps['under'] {
  const about = hover && !held ? aboutGrip(scene, hover) : null;
  if (!hover || !hoverAt || !about) return null;
  const [box] = boxesOf(scene, hover);
  return { about, thing: box ?? around(hoverAt, REACH) };
}

/** CB, CG, the line between them and the thing in hand; rather the parts and the outline of the hull with its figures too. */
export function inSightOf(
  scene: Scene,
  marks: BalanceMarks,
  held: Grip | null,
  outline: readonly PlanePoint[],
): InSight {
  return {
    clear: [...marksTaken(marks), ...(held ? boxesOf(scene, held) : [])],
    rather: [
      ...scene.figures.slice(0, MOST).map((figure) => screenBox(figure, scene.view)),
      ...outline.map((point) => around(toScreen(scene.view, point), OUTLINE_REACH)),
    ],
  };
}

/** From the skin to the figures along it, px. */
const OUTLINE_REACH = 18;

/** Enough to see where the parts are. */
const MOST = 60;

/** Boxes of the thing itself on the screen; none for a wire run, which is everywhere. */
function boxesOf(scene: Scene, grip: Grip): Rect[] {
  const { view, figures, hardpoints, support, geometry, wireHandles, thrust } = scene;
  const spot = (at: PlanePoint | null | undefined) => (at ? [around(toScreen(view, at), REACH)] : []);
  switch (grip.kind) {
    case 'part':
      return figures
        .filter(({ part, copy }) => part === grip.id && copy === grip.copy)
        .map((figure) => screenBox(figure, view));
    case 'hardpoint':
      return spot(hardpoints.find(({ id }) => id === grip.id)?.at);
    case 'support':
      return spot(support);
    case 'wireEnd':
      return wireHandles
        .filter(({ id, side }) => id === grip.id && side === grip.side)
        .flatMap(({ at, end }) => [...spot(at), ...spot(end)]);
    case 'thrust':
      return thrust
        .filter(({ part, copy }) => part === grip.id && copy === grip.copy)
        .flatMap(({ at, tip, handle }) => [
          ...spot(handle),
          ...rectsAlong(toScreen(view, at), toScreen(view, tip), REACH),
        ]);
    case 'hull':
      return spot(handlesOf(geometry, view.scale, thrust)[grip.end]);
    case 'wire':
      return [];
  }
}
