/** The list of keys, from the same table that the page obeys. */
import { DialogFrame } from '../panels/DialogFrame.tsx';
import { useEditor } from '../panels/editor.ts';
import { inUnits } from '../units/sentence.ts';
import type { UnitSystem } from '../units/units.ts';
import { isMac } from './CommandBar.tsx';
import { keysText, SHORTCUTS } from './shortcuts.ts';

type Line = readonly [how: string, does: string];

/** What a focused view takes itself, beside the table of the page. */
const IN_THE_DRAWING: readonly Line[] = [
  ['[ or ]', 'Select the part before or after'],
  ['+ or −', 'Zoom'],
  ['0', 'Fit'],
  ['← or → in the front view', 'Turn round the hull by 0.1°, with Shift by 1°'],
  [
    'Comma or full stop',
    'Turn the thrust selected by 1°, with Shift by 10°: pitch in the side view, yaw from above. The keys in the places where a US keyboard has them do so on every keyboard',
  ],
];

const IN_THE_LEDGER: readonly Line[] = [
  ['Arrows, Home, End, Page Up, Page Down', 'Go from cell to cell'],
  ['Enter, F2 or typing', 'Open the cell'],
  ['Enter', 'Take what was typed'],
  ['Esc', 'Put back what was there'],
  ['Tab', 'Take it and go on to the next cell'],
  ['↑ or ↓ in a number', 'One step more or less, with Shift ten'],
  ['Space', 'Add the row to what is selected'],
  ['Shift + ↑ or ↓', 'Select a stretch of rows'],
  ['Mod + V', 'Paste rows from a spreadsheet'],
];

/** To what a dragged station is drawn where nothing else is near. */
const SNAP_WORDS: Readonly<Record<UnitSystem, string>> = {
  metric: 'whole centimetres',
  imperial: 'quarter inches',
};

const BY_HAND: readonly Line[] = [
  ['Drag a part', 'Move it, keeping its kind of place'],
  ['Drag the amber diamonds at the hull', 'Change the hull’s length or diameter'],
  ['Drag the amber diamond at an arrow', 'Turn the thrust, within its limits'],
  ['Drag the end of a wire run', 'Join it to another part'],
  ['Shift + click', 'Add to what is selected'],
  ['Shift + drag on nothing', 'Select all within'],
  ['Alt while dragging', 'The other way about: no snapping, or snapping if Snap is off'],
  ['Snapping', 'To other parts, else to {SNAP}; round the hull to whole degrees; thrust to every 5°'],
  ['Drag on nothing, or Space + drag', 'Move the view'],
  ['Wheel, or two fingers', 'Zoom'],
];

export function KeysDialog({ onClose }: { onClose: () => void }) {
  const mac = isMac();
  const { units } = useEditor();
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
                <dd>{inUnits(does, units)}</dd>
              </div>
            ))}
          </dl>
        </section>
        <section>
          <Lines title="In the drawing" lines={IN_THE_DRAWING} />
          <Lines title="In the ledger" lines={IN_THE_LEDGER} />
          <Lines title="By hand" lines={BY_HAND} />
        </section>
      </div>
    </DialogFrame>
  );
}

const Lines = ({ title, lines }: { title: string; lines: readonly Line[] }) => {
  const { units } = useEditor();
  const mac = isMac();
  return (
    <>
      <h3>{title}</h3>
      <dl>
        {lines.map(([how, does]) => (
          <div key={how}>
            <dt>{how.replace('Mod', mac ? '⌘' : 'Ctrl')}</dt>
            <dd>{does.replace('{SNAP}', SNAP_WORDS[units])}</dd>
          </div>
        ))}
      </dl>
    </>
  );
};
