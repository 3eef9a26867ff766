/** The list of keys, from the same table that the page obeys. */
import { isMac } from './CommandBar.tsx';
import { Dialog } from './Dialog.tsx';
import { keysText, SHORTCUTS } from './shortcuts.ts';

const GESTURES: readonly (readonly [string, string])[] = [
  ['Drag a part', 'Move it, keeping its kind of place'],
  ['Drag the nose, tail or top of the hull', 'Change its length or diameter'],
  ['Drag the end of a wire run', 'Join it elsewhere'],
  ['Shift + click', 'Add to what is selected'],
  ['Alt while dragging', 'Suspend snapping'],
  ['Drag the background', 'Move the view'],
  ['Wheel, or two fingers', 'Zoom'],
];

export function KeysDialog({ onClose }: { onClose: () => void }) {
  const mac = isMac();
  return (
    <Dialog title="Keys and gestures" onClose={onClose}>
      <div className="keys">
        <dl aria-label="Keys">
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
        <dl aria-label="Gestures">
          {GESTURES.map(([gesture, does]) => (
            <div key={gesture}>
              <dt>{gesture}</dt>
              <dd>{does}</dd>
            </div>
          ))}
        </dl>
      </div>
    </Dialog>
  );
}
