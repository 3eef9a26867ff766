/** Things to mind, on one line under the verdicts; the rest opens. During a drag the line neither comes nor goes. */
import { useId, useRef, useState } from 'react';
import { useEditor } from './editor.ts';

export function CautionLine() {
  const { assessment, dragging } = useEditor();
  const { cautions } = assessment;
  const [open, setOpen] = useState(false);
  const id = useId();
  const there = useRef(false);
  if (!dragging) there.current = cautions.length > 0;
  if (!there.current) return null;
  const [first, ...rest] = cautions;
  return (
    <div className="caution-line">
      <p className="caution-first" title={cautions.join('\n')}>
        {first !== undefined && (
          <>
            <strong>Mind:</strong> {first}
          </>
        )}
      </p>
      {first !== undefined && (
        <button
          type="button"
          className="small"
          aria-expanded={open}
          aria-controls={id}
          onClick={() => setOpen(!open)}
          onBlur={() => setOpen(false)}
        >
          {rest.length > 0 ? `All ${cautions.length}` : 'Whole'}
        </button>
      )}
      <ul id={id} className="caution-all" hidden={!open}>
        {cautions.map((caution) => (
          <li className="caution" key={caution}>
            {caution}
          </li>
        ))}
      </ul>
    </div>
  );
}
