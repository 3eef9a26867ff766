/** The report of a craft for reading at a terminal. */
import type { Craft } from '../craft/craft.ts';
import type { Assessment } from '../report/assessment.ts';
import { hazardsOf } from '../report/hazards.ts';
import type { Verdict } from '../report/verdict.ts';
import type { UnitSystem } from '../units/units.ts';
import { beamTable } from './beamTable.ts';
import { figures } from './figures.ts';
import { left, oneLine, wrapped } from './layout.ts';

export function reportText(craft: Craft, report: Assessment, units: UnitSystem): string {
  const { headline, verdicts, rows, geometry, cautions } = report;
  const beam = geometry.status === 'solved' ? [...beamTable(geometry, units), ''] : [];
  const lines = [
    ...wrapped(craft.name || 'Craft without a name'),
    ...wrapped(headline),
    '',
    'Verdicts',
    ...verdicts.flatMap(verdictLines),
    '',
    ...figures(rows, units),
    ...beam,
    'Cautions',
    ...[...cautions, ...hazardsOf(craft)].flatMap(bullet),
  ];
  return `${lines.join('\n')}\n`;
}

const bullet = (sentence: string): string[] =>
  wrapped(sentence, 4).map((line, i) => (i === 0 ? `  - ${line.slice(4)}` : line));

function verdictLines(verdict: Verdict): string[] {
  const { state, title, word, figure, side, target, marginWords } = verdict;
  const cells = [left(state, 8), `${left(title, 19)} `, left(word, 16), `${figure} ${side}`.trimEnd()];
  const by = marginWords && `: ${marginWords}`;
  return [oneLine(`  ${cells.join('')}`), ...wrapped(`wanted ${target}${by}`, 10), ...reason(verdict)];
}

const reason = ({ state, row: { status, why } }: Verdict): string[] =>
  status === 'solved' || state === 'met' ? [] : wrapped(why, 10);
