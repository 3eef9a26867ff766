/** The one sentence, and the five verdicts, each opening into its working. */
import { type KeyboardEvent, useId, useState } from 'react';
import { rowText } from '../report/rowText.ts';
import type { Verdict } from '../report/verdict.ts';
import type { UnitSystem } from '../units/units.ts';
import { useEditor } from './editor.ts';
import { RowList } from './RowList.tsx';

export function Verdicts() {
  const { assessment, units } = useEditor();
  return (
    <section className="verdicts" aria-label="Verdicts">
      <p className="headline" data-met={assessment.met} role="status">
        {assessment.headline}
      </p>
      <ul className="verdict-list">
        {assessment.verdicts.map((verdict) => (
          <li key={verdict.key}>
            <VerdictCard verdict={verdict} units={units} />
          </li>
        ))}
      </ul>
      {assessment.cautions.map((caution) => (
        <p className="caution" key={caution}>
          <strong>Mind:</strong> {caution}
        </p>
      ))}
    </section>
  );
}

const STATE_WORDS: Readonly<Record<Verdict['state'], string>> = {
  met: 'meets its target',
  missed: 'misses its target',
  open: 'is open',
};

function VerdictCard({ verdict, units }: { verdict: Verdict; units: UnitSystem }) {
  const [open, setOpen] = useState(false);
  const id = useId();
  const { row, state } = verdict;
  const onKeyDown = (event: KeyboardEvent) => {
    if (!open || event.key !== 'Escape') return;
    event.stopPropagation();
    setOpen(false);
  };
  return (
    <div className="verdict" data-state={state} data-verdict={verdict.key}>
      <button
        type="button"
        className="verdict-face"
        aria-expanded={open}
        aria-controls={id}
        onClick={() => setOpen(!open)}
        onKeyDown={onKeyDown}
      >
        <span className="verdict-title">{verdict.title}</span>
        <span className="verdict-word">{verdict.word}</span>
        <span className="verdict-number number">{rowText(row, units)}</span>
        <span className="verdict-margin">{verdict.marginWords}</span>
        <span className="verdict-state">{STATE_WORDS[state]}</span>
      </button>
      <div id={id} className="verdict-working" hidden={!open}>
        {open && <WorkingText verdict={verdict} units={units} />}
      </div>
    </div>
  );
}

function WorkingText({ verdict: { row, target, working }, units }: { verdict: Verdict; units: UnitSystem }) {
  return (
    <>
      <p>
        <strong>Wanted:</strong> {target}.
      </p>
      {row.status !== 'solved' && <p>{row.why}</p>}
      <p className="formula">{working.formula}</p>
      <RowList rows={working.inputs} units={units} />
      <p className="source">
        <strong>Source:</strong> {working.source}
      </p>
    </>
  );
}
