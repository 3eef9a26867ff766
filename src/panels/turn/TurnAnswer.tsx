/** How it turns in one sentence, and what the targets say to that. */
import { useState } from 'react';
import type { TurnReport } from '../../report/turning/turnReport.ts';
import type { TurnVerdict } from '../../report/turning/turnVerdicts.ts';
import { useEditor } from '../editor.ts';
import { WorkingBody } from '../WorkingBody.tsx';

interface TurnAnswerProps {
  readonly report: TurnReport;
  readonly onTargets: () => void;
}

export function TurnAnswer({ report, onTargets }: TurnAnswerProps) {
  const { craft } = useEditor();
  const { turnTime, sideGust } = craft.targets;
  const unasked = turnTime === null || sideGust === null;
  return (
    <>
      <p className="plan-headline">{report.headline}</p>
      {report.handling.map((words) => (
        <p key={words} className="turn-cost">
          {words}
        </p>
      ))}
      {report.costWords.map((words) => (
        <p key={words} className="turn-cost">
          {words}
        </p>
      ))}
      {report.verdicts.length > 0 && (
        <ul className="turn-verdicts">
          {report.verdicts.map((verdict) => (
            <li key={verdict.key}>
              <Verdict verdict={verdict} />
            </li>
          ))}
        </ul>
      )}
      {unasked && report.turn && (
        <p className="aside">
          {turnTime === null && sideGust === null
            ? 'Nothing is asked of its turning yet: '
            : `${turnTime === null ? 'No turn time' : 'No side gust'} is asked for: `}
          <button type="button" className="link" onClick={onTargets}>
            Targets
          </button>
        </p>
      )}
    </>
  );
}

function Verdict({ verdict }: { verdict: TurnVerdict }) {
  const [open, setOpen] = useState(false);
  const { key, state, close, title, word, figure, marginWords, target, need, row, working } = verdict;
  return (
    <div className="verdict" data-state={close ? 'close' : state} data-verdict={key}>
      <button type="button" className="turn-verdict-face" aria-expanded={open} onClick={() => setOpen(!open)}>
        <span className="verdict-title">{title}</span>
        <span className="verdict-word">{word}</span>
        <span className="verdict-number">{figure}</span>
        <span className="verdict-margin">
          {target}
          {marginWords && `, ${marginWords}`}
        </span>
      </button>
      {open && (
        <div className="figure-working">
          {row.status !== 'solved' && <p>{row.why}</p>}
          {need.map((sentence) => (
            <p key={sentence}>{sentence}</p>
          ))}
          <WorkingBody working={working} />
        </div>
      )}
    </div>
  );
}
