/** Figures under headings. Each opens into its formula, the figures that went in, and the source; one leads to the other. */
import { type ReactNode, type RefObject, useRef, useState } from 'react';
import type { Row, RowStatus } from '../report/row.ts';
import { rowText } from '../report/rowText.ts';
import type { Working } from '../report/verdict.ts';
import { useEditor } from './editor.ts';
import type { FigureGroup } from './figureGroups.ts';
import { FIGURE_HINTS } from './figureHints.ts';
import { WorkingBody } from './WorkingBody.tsx';

const STATUS_WORDS: Readonly<Record<RowStatus, string>> = {
  solved: '',
  caution: 'Mind',
  infeasible: 'Not possible',
};

export interface FigureSheet {
  /** Around all the lists between which one jumps. */
  readonly frame: RefObject<HTMLElement | null>;
  readonly open: ReadonlySet<string>;
  readonly toggle: (key: string) => void;
  readonly jump: (key: string) => void;
}

export function useFigureSheet(): FigureSheet {
  const [open, setOpen] = useState<ReadonlySet<string>>(new Set());
  const frame = useRef<HTMLElement>(null);
  return {
    frame,
    open,
    toggle: (key) =>
      setOpen((before) => {
        const next = new Set(before);
        if (!next.delete(key)) next.add(key);
        return next;
      }),
    jump: (key) => {
      setOpen((before) => new Set(before).add(key));
      const face = frame.current?.querySelector<HTMLElement>(`[data-figure="${key}"] > button`);
      const folded = face?.closest('details');
      if (folded) folded.open = true;
      face?.scrollIntoView({ block: 'nearest' });
      face?.focus();
    },
  };
}

interface FigureListProps {
  readonly rows: FigureGroup['rows'];
  readonly sheet: FigureSheet;
  /** Every figure there is to go to. */
  readonly all: Readonly<Record<string, Row>>;
  workingOf(key: string): Working | null;
  /** What can be done about a figure. */
  readonly action?: (key: string) => ReactNode;
  /** Whether what is told of a figure that stands is read when it is opened, and not before. */
  readonly whyInside?: boolean;
  /** Figures of before the last change. */
  readonly isOld?: (key: string) => boolean;
}

export function FigureList({ rows, ...rest }: FigureListProps) {
  return (
    <ul className="figures">
      {rows.map(({ key, row }, i) => (
        <Figure
          key={key}
          name={key}
          row={row}
          said={row.why !== '' && rows.slice(0, i).some((before) => before.row.why === row.why)}
          {...rest}
        />
      ))}
    </ul>
  );
}

interface FigureProps extends Omit<FigureListProps, 'rows'> {
  readonly name: string;
  readonly row: Row;
  /** Whether a figure above says the same of itself. */
  readonly said: boolean;
}

function Figure(props: FigureProps) {
  const { name, row, said, sheet, all, workingOf, action, whyInside, isOld } = props;
  const { units } = useEditor();
  const open = sheet.open.has(name);
  const word = STATUS_WORDS[row.status];
  const working = open ? workingOf(name) : null;
  const hint = FIGURE_HINTS[name] ?? (whyInside && !word ? row.why : undefined);
  return (
    <li data-figure={name} data-status={row.status} className={isOld?.(name) ? 'plan-old' : undefined}>
      <button
        type="button"
        className="figure-face"
        title={hint}
        aria-expanded={open}
        onClick={() => sheet.toggle(name)}
      >
        <span className="figure-label">{row.label}</span>{' '}
        <span className="number">{rowText(row, units)}</span>
      </button>
      {(word || (row.why && !whyInside)) && (open || !said) && (
        <p className="row-why">
          {word && <strong>{word}: </strong>}
          {row.why}
        </p>
      )}
      {action?.(name)}
      {open && (
        <div className="figure-working">
          {hint && <p>{hint}</p>}
          {working ? <WorkingBody working={working} rows={all} onJump={sheet.jump} /> : <p>As entered.</p>}
        </div>
      )}
    </li>
  );
}
