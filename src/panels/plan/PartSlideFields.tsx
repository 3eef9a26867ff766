/** The stretch along which the plan may move a part. */
import type { Part } from '../../craft/schema.ts';
import { stationOf } from '../../craft/station.ts';
import { setSlide } from '../../edit/edits/parts.ts';
import { slideAbout } from '../../edit/place.ts';
import { useCommit } from '../commit.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { SlideEnds } from './SlideEnds.tsx';

export function PartSlideFields({ part }: { part: Part }) {
  const { apply, assessment } = useEditor();
  const commit = useCommit();
  const { slide, locked } = part;
  const length = assessment.rows['hull.length']?.value ?? 0;
  const first = slideAbout(stationOf(part.place), length);
  return (
    <>
      <CheckField
        label="The plan may slide it"
        value={slide !== null}
        onCommit={(may) => apply(setSlide(part, may ? first : null))}
      />
      {slide && (
        <SlideEnds prefix="Slide" slide={slide} onSlide={(next, run) => commit(setSlide(part, next), run)} />
      )}
      {slide && locked && <p className="aside">Locked in place: the plan leaves it where it is.</p>}
    </>
  );
}
