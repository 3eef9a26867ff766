/** Every figure of the report. Each opens into its formula, the figures that went in, and the source. */
import { useRef, useState } from 'react';
import type { Row, RowStatus } from '../report/row.ts';
import { rowText } from '../report/rowText.ts';
import { workingOf } from '../report/workings.ts';
import { AdviceButton } from './AdviceButton.tsx';
import { useEditor } from './editor.ts';
import { figureGroups } from './figureGroups.ts';
import { FIGURE_HINTS } from './figureHints.ts';
import { WorkingBody } from './WorkingBody.tsx';

const STATUS_WORDS: Readonly<Record<RowStatus, string>> = {
  solved: '',
  caution: 'Mind',
  infeasible: 'Not possible',
};

export function FiguresPanel() {
  const { rows } = useEditor().assessment;
  const [open, setOpen] = useState<ReadonlySet<string>>(new Set());
  const panel = useRef<HTMLElement>(null);
  const toggle = (key: string) =>
    setOpen((before) => {
      const next = new Set(before);
      if (!next.delete(key)) next.add(key);
      return next;
    });
  const jump = (key: string) => {
    setOpen((before) => new Set(before).add(key));
    const face = panel.current?.querySelector<HTMLElement>(`[data-figure="${key}"] > button`);
    face?.scrollIntoView({ block: 'nearest' });
    face?.focus();
  };
  return (
    <section className="panel" aria-label="Figures" ref={panel}>
      {figureGroups(rows).map((group) => (
        <section key={group.title} aria-label={group.title}>
          <h3>{group.title}</h3>
          <ul className="figures">
            {group.rows.map(({ key, row }) => (
              <Figure key={key} name={key} row={row} open={open.has(key)} onToggle={toggle} onJump={jump} />
            ))}
          </ul>
        </section>
      ))}
    </section>
  );
}

interface FigureProps {
  readonly name: string;
  readonly row: Row;
  readonly open: boolean;
  onToggle(key: string): void;
  onJump(key: string): void;
}

function Figure({ name, row, open, onToggle, onJump }: FigureProps) {
  const { assessment, units } = useEditor();
  const word = STATUS_WORDS[row.status];
  const working = open ? workingOf(name, assessment.rows) : null;
  return (
    <li data-figure={name} data-status={row.status}>
      <button
        type="button"
        className="figure-face"
        title={FIGURE_HINTS[name]}
        aria-expanded={open}
        onClick={() => onToggle(name)}
      >
        <span className="figure-label">{row.label}</span>{' '}
        <span className="number">{rowText(row, units)}</span>
      </button>
      {(word || row.why) && (
        <p className="row-why">
          {word && <strong>{word}: </strong>}
          {row.why}
        </p>
      )}
      {name === 'oneWeight.station' && <AdviceButton kind="load" />}
      {open && (
        <div className="figure-working">
          {FIGURE_HINTS[name] && <p>{FIGURE_HINTS[name]}</p>}
          {working ? <WorkingBody working={working} onJump={onJump} /> : <p>As entered.</p>}
        </div>
      )}
    </li>
  );
}
