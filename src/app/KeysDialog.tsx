/** The list of keys, from the same table that the page obeys. */
import { DialogFrame } from '../panels/DialogFrame.tsx';
import { isMac } from './CommandBar.tsx';
import { keysText, SHORTCUTS } from './shortcuts.ts';

type Line = readonly [how: string, does: string];

/** What a focused view takes itself, beside the table of the page. */
const IN_THE_DRAWING: readonly Line[] = [
  ['[ or ]', 'Select the part before or after'],
  ['+ or −', 'Zoom'],
  ['0', 'Fit'],
  ['← or → in the front view', 'Turn round the hull'],
];

const BY_HAND: readonly Line[] = [
  ['Drag a part', 'Move it, keeping its kind of place'],
  ['Drag the amber diamonds', 'Change the hull’s length or diameter'],
  ['Drag the end of a wire run', 'Join it to another part'],
  ['Shift + click', 'Add to what is selected'],
  ['Shift + drag on nothing', 'Select all within'],
  ['Alt while dragging', 'No snapping'],
  ['Drag on nothing, or Space + drag', 'Move the view'],
  ['Wheel, or two fingers', 'Zoom'],
];

export function KeysDialog({ onClose }: { onClose: () => void }) {
  const mac = isMac();
  return (
    <DialogFrame title="Keys and gestures" onClose={onClose}>
      <div className="keys">
        <section>
          <h3>Anywhere</h3>
          <dl>
            {SHORTCUTS.map(({ command, keys, does }) => (
              <div key={command}>
                <dt>
                  {keys.map((each) => (
                    <kbd key={each}>{keysText(each, mac)}</kbd>
                  ))}
                </dt>
                <dd>{does}</dd>
              </div>
            ))}
          </dl>
        </section>
        <section>
          <Lines title="In the drawing" lines={IN_THE_DRAWING} />
          <Lines title="By hand" lines={BY_HAND} />
        </section>
      </div>
    </DialogFrame>
  );
}

const Lines = ({ title, lines }: { title: string; lines: readonly Line[] }) => (
  <>
    <h3>{title}</h3>
    <dl>
      {lines.map(([how, does]) => (
        <div key={how}>
          <dt>{how}</dt>
          <dd>{does}</dd>
        </div>
      ))}
    </dl>
  </>
);
