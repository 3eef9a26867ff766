/** The one sentence, in a frame of fixed height, and the buttons that do what it advises. */
import { type RefObject, useId, useLayoutEffect, useRef, useState } from 'react';
import { AdviceButton } from './AdviceButton.tsx';
import { headlineAdvice } from './advice.ts';
import { useEditor } from './editor.ts';

export function Headline() {
  const { assessment, craft, dragging } = useEditor();
  const { headline, met } = assessment;
  const text = useRef<HTMLParagraphElement>(null);
  // Not at every move of a drag: to look is to have the page laid out at once.
  const cut = useCut(text, dragging ? null : headline);
  const [open, setOpen] = useState(false);
  const id = useId();
  return (
    <div className="headline-frame">
      <p className="headline" ref={text} data-met={met} role="status" title={headline}>
        {headline}
      </p>
      <div className="headline-buttons">
        {headlineAdvice(assessment, craft).map((kind) => (
          <AdviceButton key={kind} kind={kind} />
        ))}
        {cut && (
          <button
            type="button"
            className="small"
            aria-expanded={open}
            aria-controls={id}
            onClick={() => setOpen(!open)}
            onBlur={() => setOpen(false)}
          >
            More
          </button>
        )}
      </div>
      <p id={id} className="headline-whole" hidden={!(open && cut)}>
        {headline}
      </p>
    </div>
  );
}

/** Whether the text does not fit into its frame. */
function useCut(text: RefObject<HTMLElement | null>, content: string | null): boolean {
  const [cut, setCut] = useState(false);
  useLayoutEffect(() => {
    if (content === null) return;
    const element = text.current!;
    const look = () => setCut(element.scrollHeight > element.clientHeight + 1);
    look();
    const observer = new ResizeObserver(look);
    observer.observe(element);
    return () => observer.disconnect();
  }, [text, content]);
  return cut;
}
