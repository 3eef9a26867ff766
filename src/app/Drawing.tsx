/** Side view, beam and front view. Side view and beam share one scale of stations. */
import type { Editor } from '../panels/editor.ts';
import type { Palette } from '../scene/palette.ts';
import type { Store } from './store.ts';

interface DrawingProps {
  readonly store: Store;
  readonly editor: Editor;
  readonly palette: Palette;
}

export function Drawing({ editor }: DrawingProps) {
  return <div className="drawing">{editor.craft.name}</div>;
}
