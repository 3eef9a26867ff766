/** What a click or key in a table does to the selection. Pure. */
import { idsOf, type Selectable, type Selection, toggled } from '../../edit/selection.ts';

export interface PickKeys {
  /** Ctrl or Cmd: in or out, the rest stays. */
  readonly toggle: boolean;
  /** Shift: everything from the row picked last to this one. */
  readonly extend: boolean;
}

export const PLAIN: PickKeys = { toggle: false, extend: false };

/** `order`: ids as shown. The range starts at the row of that kind selected first, which stays first. */
export function picked(
  selection: Selection,
  kind: Selectable['kind'],
  id: string,
  order: readonly string[],
  { toggle, extend }: PickKeys,
): Selection {
  const thing: Selectable = { kind, id };
  const anchor = idsOf(selection, kind)[0];
  if (extend && anchor !== undefined && order.includes(anchor)) {
    return rangeOf(order, anchor, id).map((each) => ({ kind, id: each }));
  }
  return toggle ? toggled(selection, thing) : [thing];
}

/** From one to the other as shown, both included, beginning with `from`. */
function rangeOf(order: readonly string[], from: string, to: string): string[] {
  const [start, end] = [order.indexOf(from), order.indexOf(to)];
  return start <= end ? order.slice(start, end + 1) : order.slice(end, start + 1).reverse();
}
