/** What is wished for after least dead ballast, in order; a wish that is off the list does not count. */
import { type KeyboardEvent, useRef } from 'react';
import { WISHES, type Wish } from '../../craft/planningSchema.ts';
import { setWishes } from '../../edit/edits/craft.ts';
import { useEditor } from '../editor.ts';
import { OrderCheck } from './OrderCheck.tsx';

const WORDS: Readonly<Record<Wish, string>> = {
  usefulLoad: 'Most useful load, by rank',
  fewestMoved: 'Fewest parts moved',
  leastWire: 'Least wire',
};

export function WishList() {
  const { craft, apply } = useEditor();
  const { wishes } = craft;
  const list = useRef<HTMLOListElement>(null);
  const off = WISHES.filter((wish) => !wishes.includes(wish));
  const move = (from: number, by: number, control: 'name' | 'arrow') => {
    const to = from + by;
    const wish = wishes[from];
    if (!wish || to < 0 || to >= wishes.length) return;
    apply(setWishes(wishes.toSpliced(from, 1).toSpliced(to, 0, wish)));
    focusOn(list.current?.children[to], control, by);
  };
  return (
    <>
      <p className="aside">
        Least dead ballast comes first always. Then, each without giving up what stands above it:
      </p>
      <ol className="wishes" ref={list} aria-label="Wishes in order">
        {wishes.map((wish, at) => (
          <WishItem
            // biome-ignore lint/suspicious/noArrayIndexKey: each rank keeps its buttons, so that the focus can follow a wish to another
            key={at}
            wish={wish}
            at={at}
            last={at === wishes.length - 1}
            onMove={(by, control) => move(at, by, control)}
            onRemove={() => apply(setWishes(wishes.toSpliced(at, 1)))}
          />
        ))}
      </ol>
      {off.map((wish) => (
        <button key={wish} type="button" onClick={() => apply(setWishes([...wishes, wish]))}>
          Add “{WORDS[wish]}”
        </button>
      ))}
      <OrderCheck />
    </>
  );
}

/** The same control at the wish's new rank; its name where that control can go no further. */
function focusOn(item: Element | undefined, control: 'name' | 'arrow', by: number): void {
  const arrow = item?.querySelector<HTMLButtonElement>(`[data-by="${by}"]:enabled`);
  (control === 'arrow' && arrow ? arrow : item?.querySelector<HTMLElement>('[data-wish]'))?.focus();
}

interface WishItemProps {
  readonly wish: Wish;
  readonly at: number;
  readonly last: boolean;
  onMove(by: number, control: 'name' | 'arrow'): void;
  onRemove(): void;
}

function WishItem({ wish, at, last, onMove, onRemove }: WishItemProps) {
  const onKeyDown = (event: KeyboardEvent) => {
    const by = event.key === 'ArrowUp' ? -1 : event.key === 'ArrowDown' ? 1 : 0;
    if (by === 0) return;
    event.preventDefault();
    event.stopPropagation();
    onMove(by, 'name');
  };
  const name = WORDS[wish];
  return (
    <li>
      <button
        type="button"
        className="wish-name"
        data-wish={wish}
        aria-label={`${at + 1}. ${name}. Arrow up and down change its rank.`}
        onKeyDown={onKeyDown}
      >
        <span aria-hidden="true">{at + 1}.</span> {name}
      </button>
      <span className="row-actions">
        <button
          type="button"
          aria-label={`Raise ${name}`}
          disabled={at === 0}
          data-by={-1}
          onClick={() => onMove(-1, 'arrow')}
        >
          ↑
        </button>
        <button
          type="button"
          aria-label={`Lower ${name}`}
          disabled={last}
          data-by={1}
          onClick={() => onMove(1, 'arrow')}
        >
          ↓
        </button>
        <button type="button" aria-label={`Leave out ${name}`} onClick={onRemove}>
          −
        </button>
      </span>
    </li>
  );
}
