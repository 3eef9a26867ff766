/** Where a load may go: hardpoints by their boxes, and stretches along the hull. */
import { listed } from '../../craft/craft.ts';
import type { Load, LoadOption } from '../../craft/planningSchema.ts';
import { withStation } from '../../craft/station.ts';
import { addLoadOption, removeLoadOption, setLoadOption } from '../../edit/edits/loads.ts';
import { useCommit } from '../commit.ts';
import { defaultPlace } from '../defaults.ts';
import { useEditor } from '../editor.ts';
import { CheckField } from '../fields/CheckField.tsx';
import { LineFields } from './LineFields.tsx';
import { SlideEnds } from './SlideEnds.tsx';

type SlideOption = Extract<LoadOption, { kind: 'slide' }>;

export function LoadPlaces({ load }: { load: Load }) {
  const { craft, assessment, apply } = useEditor();
  const slides = load.options.flatMap((option, index) =>
    option.kind === 'slide' ? [{ option, index }] : [],
  );
  const add = () => {
    const place = defaultPlace(assessment);
    const at = place.kind === 'keel' ? place.station : 0;
    apply(addLoadOption(load, { kind: 'slide', place, from: at, to: at }));
  };
  return (
    <fieldset className="load-places">
      <legend>Where it may go</legend>
      {load.options.length === 0 && (
        <p className="field-error">Nowhere yet: choose a hardpoint or add a slide.</p>
      )}
      {listed(craft.hardpoints).map(({ id, name }) => (
        <HardpointBox key={id} load={load} hardpoint={id} name={name || 'Hardpoint'} />
      ))}
      {slides.map(({ option, index }, i) => (
        <SlideFields key={index} load={load} option={option} index={index} number={i + 1} />
      ))}
      <button type="button" onClick={add}>
        Add a slide
      </button>
    </fieldset>
  );
}

interface HardpointBoxProps {
  readonly load: Load;
  readonly hardpoint: string;
  readonly name: string;
}

function HardpointBox({ load, hardpoint, name }: HardpointBoxProps) {
  const { apply } = useEditor();
  const index = load.options.findIndex((each) => each.kind === 'hardpoint' && each.hardpoint === hardpoint);
  return (
    <CheckField
      label={`At ${name}`}
      value={index >= 0}
      onCommit={(may) =>
        apply(may ? addLoadOption(load, { kind: 'hardpoint', hardpoint }) : removeLoadOption(load, index))
      }
    />
  );
}

interface SlideFieldsProps {
  readonly load: Load;
  readonly option: SlideOption;
  readonly index: number;
  readonly number: number;
}

function SlideFields({ load, option, index, number }: SlideFieldsProps) {
  const { apply } = useEditor();
  const commit = useCommit();
  const prefix = `Slide ${number}`;
  return (
    <fieldset className="load-slide" aria-label={prefix}>
      <SlideEnds
        prefix={prefix}
        slide={option}
        onSlide={(slide, run) => {
          const place = withStation(option.place, slide.from);
          return commit(setLoadOption(load, index, { ...option, ...slide, place }), run);
        }}
      />
      <LineFields
        prefix={prefix}
        place={option.place}
        onPlace={(place, run) => commit(setLoadOption(load, index, { ...option, place }), run)}
      />
      <button type="button" onClick={() => apply(removeLoadOption(load, index))}>
        Remove slide {number}
      </button>
    </fieldset>
  );
}
