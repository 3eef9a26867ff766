/** Tabs over one place, one in front at a time; arrow keys go along them. */
import { type KeyboardEvent, type ReactNode, useId } from 'react';

export interface Tab<T extends string> {
  readonly id: T;
  readonly title: string;
}

export interface TabsProps<T extends string> {
  readonly label: string;
  readonly tabs: readonly Tab<T>[];
  readonly front: T;
  onFront(id: T): void;
  /** Class of what stands under the tabs. */
  readonly body: string;
  /** Whether that scrolls and holds text to read, so that the keys must reach it. */
  readonly focusable?: boolean;
  readonly children: ReactNode;
}

export function Tabs<T extends string>(props: TabsProps<T>) {
  const { label, tabs, front, onFront, body, focusable, children } = props;
  const base = useId();
  const onKeyDown = (event: KeyboardEvent) => {
    const next = tabFrom(tabs, front, event.key);
    if (!next) return;
    event.preventDefault();
    event.stopPropagation();
    onFront(next);
    document.getElementById(`${base}-${next}`)?.focus();
  };
  return (
    <>
      <div className="tabs" role="tablist" aria-label={label} onKeyDown={onKeyDown}>
        {tabs.map(({ id, title }) => (
          <button
            key={id}
            type="button"
            role="tab"
            id={`${base}-${id}`}
            aria-selected={id === front}
            aria-controls={`${base}-panel`}
            tabIndex={id === front ? 0 : -1}
            onClick={() => onFront(id)}
          >
            {title}
          </button>
        ))}
      </div>
      <div
        className={body}
        role="tabpanel"
        id={`${base}-panel`}
        aria-labelledby={`${base}-${front}`}
        tabIndex={focusable ? 0 : undefined}
      >
        {children}
      </div>
    </>
  );
}

function tabFrom<T extends string>(tabs: readonly Tab<T>[], front: T, key: string): T | undefined {
  const at = tabs.findIndex(({ id }) => id === front);
  const steps: Readonly<Record<string, number>> = { ArrowLeft: at - 1, ArrowRight: at + 1, Home: 0, End: -1 };
  const to = steps[key];
  return to === undefined ? undefined : tabs.at(to % tabs.length)?.id;
}
