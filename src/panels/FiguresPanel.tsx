/** Every figure of the report. */
import { workingOf } from '../report/workings.ts';
import { AdviceButton } from './AdviceButton.tsx';
import { useEditor } from './editor.ts';
import { FigureList, useFigureSheet } from './FigureSheet.tsx';
import { figureGroups } from './figureGroups.ts';

export function FiguresPanel() {
  const { rows } = useEditor().assessment;
  const sheet = useFigureSheet();
  return (
    <section className="panel" aria-label="Figures" ref={sheet.frame}>
      {figureGroups(rows).map((group) => (
        <section key={group.title} aria-label={group.title}>
          <h3>{group.title}</h3>
          <FigureList
            rows={group.rows}
            sheet={sheet}
            all={rows}
            workingOf={(key) => workingOf(key, rows)}
            action={(key) => key === 'oneWeight.station' && <AdviceButton kind="load" />}
          />
        </section>
      ))}
    </section>
  );
}
