/** The figures of thrust and turning in groups, each opening into its working. */

import { rowText } from '../../report/rowText.ts';
import { MODEL_ERROR } from '../../report/turning/modelError.ts';
import { noneOnce } from '../../report/turning/noneOnce.ts';
import type { TurnReport } from '../../report/turning/turnReport.ts';
import { turnWorkingOf } from '../../report/turning/turnWorkings.ts';
import { useEditor } from '../editor.ts';
import { FigureList, type FigureSheet } from '../FigureSheet.tsx';
import { Foldable } from '../plan/Foldable.tsx';
import { PropellerTable } from './PropellerTable.tsx';
import { ClimbPlot, SpeedPlot, SteadyPlot } from './plots.tsx';
import { type TurnGroup, turnGroups } from './turnGroups.ts';

interface TurnFiguresProps {
  readonly report: TurnReport;
  readonly rows: TurnReport['rows'];
  readonly sheet: FigureSheet;
  isOld(key: string): boolean;
}

export function TurnFigures(props: TurnFiguresProps) {
  const { report, rows } = props;
  return (
    <>
      {turnGroups(rows).map((group) => (
        <Group key={group.id} group={group} {...props} />
      ))}
      {report.propellers.length > 0 && (
        <Foldable title="One large or several small" note="">
          <PropellerTable lines={report.propellers} />
        </Foldable>
      )}
    </>
  );
}

/** What does not stand elsewhere on the panel. */
const cutNotes = ({ notes, handling }: TurnReport): string[] =>
  notes.filter((note) => note !== MODEL_ERROR && !handling.includes(note));

function Group({ group, report, rows, sheet, isOld }: TurnFiguresProps & { group: TurnGroup }) {
  const { units } = useEditor();
  const { beside } = group;
  const row = beside && rows[beside.key];
  const note = beside && row && row.value !== null ? beside.words.replace('#', rowText(row, units)) : '';
  return (
    <Foldable title={group.title} note={note} open={group.id === 'turning'}>
      <FigureList
        rows={noneOnce(group.rows)}
        sheet={sheet}
        all={rows}
        workingOf={(key) => turnWorkingOf(key, rows)}
        whyInside
        isOld={isOld}
      />
      {group.id === 'turning' && <p className="aside">{MODEL_ERROR}</p>}
      {group.id === 'turning' && <SteadyPlot curve={report.steadyCurve} />}
      {group.id === 'pitch' && <ClimbPlot curve={report.climbCurve} rows={rows} />}
      {group.id === 'speed' && <SpeedPlot curve={report.speedCurve} />}
      {group.id === 'cut' && cutNotes(report).map((note) => <p key={note}>{note}</p>)}
    </Foldable>
  );
}
