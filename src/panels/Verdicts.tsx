/** The one sentence, and the five verdicts, each opening into its working. Of one height whatever they say, so that the drawing under them stays where it is. */
import { type KeyboardEvent, useId, useState } from 'react';
import type { Verdict } from '../report/verdict.ts';
import { AdviceButton } from './AdviceButton.tsx';
import { CautionLine } from './CautionLine.tsx';
import { useEditor } from './editor.ts';
import { VERDICT_HINTS } from './figureHints.ts';
import { Headline } from './Headline.tsx';
import { WorkingBody } from './WorkingBody.tsx';
import './verdicts.css';

export function Verdicts() {
  const { assessment } = useEditor();
  return (
    <section className="verdicts" aria-label="Verdicts">
      <Headline />
      <ul className="verdict-list">
        {assessment.verdicts.map((verdict) => (
          <li key={verdict.key}>
            <VerdictCard verdict={verdict} />
          </li>
        ))}
      </ul>
      <CautionLine />
    </section>
  );
}

const STATE_WORDS: Readonly<Record<Verdict['state'], string>> = {
  met: 'meets its target',
  missed: 'misses its target',
  open: 'is advice, not a target',
};

function VerdictCard({ verdict }: { verdict: Verdict }) {
  const [open, setOpen] = useState(false);
  const id = useId();
  const { state, title, word, figure, side, marginWords } = verdict;
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
        title={`${VERDICT_HINTS[verdict.key]}. ${title}: ${word}, ${figure} ${side}${marginWords && `, ${marginWords}`}`}
        aria-expanded={open}
        aria-controls={id}
        onClick={() => setOpen(!open)}
        onKeyDown={onKeyDown}
      >
        <span className="verdict-title">{title}</span>
        <span className="verdict-word">{word}</span>
        <span className="verdict-number">
          {figure} <small>{side}</small>
        </span>
        <span className="verdict-margin">{marginWords}</span>
        <span className="verdict-state">{STATE_WORDS[state]}</span>
      </button>
      <div id={id} className="verdict-working" hidden={!open}>
        {open && <WorkingText verdict={verdict} />}
      </div>
    </div>
  );
}

function WorkingText({ verdict }: { verdict: Verdict }) {
  const { key, row, target, working } = verdict;
  return (
    <>
      <p>{VERDICT_HINTS[key]}.</p>
      <p>
        <strong>Wanted:</strong> {target}.
      </p>
      {row.status !== 'solved' && <p>{row.why}</p>}
      {key === 'lead' && <AdviceButton kind="lead" />}
      {key === 'level' && <AdviceButton kind="slide" />}
      {key === 'floats' && <AdviceButton kind="load" />}
      <WorkingBody working={working} />
    </>
  );
}
