/** Where lead may hang and which parts may slide. */
import { listed } from '../../craft/craft.ts';
import { formatQuantity } from '../../units/format.ts';
import { useEditor } from '../editor.ts';
import { FILL_WORDS } from './fillWords.ts';
import { HardpointPlanFields } from './HardpointPlanFields.tsx';
import { PartSlideFields } from './PartSlideFields.tsx';

export function Freedoms() {
  const { craft, units } = useEditor();
  const sliding = listed(craft.parts).filter(({ id, slide }) => slide && !(id in craft.loads.byId));
  const mass = (value: number) => formatQuantity(value, 'mass', units);
  const length = (value: number) => formatQuantity(value, 'length', units);
  return (
    <>
      {listed(craft.hardpoints).map((hardpoint) => (
        <details className="load" key={hardpoint.id}>
          <summary>
            <span className="load-name">{hardpoint.name || 'Hardpoint'}</span>{' '}
            <span className="aside">
              up to {mass(hardpoint.limit)}, {FILL_WORDS[hardpoint.fill].toLowerCase()}
            </span>
          </summary>
          <HardpointPlanFields hardpoint={hardpoint} />
        </details>
      ))}
      {sliding.map((part) => (
        <details className="load" key={part.id}>
          <summary>
            <span className="load-name">{part.name || 'Part'}</span>{' '}
            {part.slide && (
              <span className="aside">
                slides {length(part.slide.from)} to {length(part.slide.to)}
              </span>
            )}
          </summary>
          <PartSlideFields part={part} />
        </details>
      ))}
      <p className="aside">To let another part slide, pick it and look under Selected.</p>
    </>
  );
}
