/** What `turn` prints to read: headline, verdicts and what one looks for first; the long rest with --all. */
import type { Craft } from '../craft/craft.ts';
import { hazardsOf } from '../report/hazards.ts';
import type { Rows } from '../report/rows.ts';
import { rowText } from '../report/rowText.ts';
import { noneOnce } from '../report/turning/noneOnce.ts';
import { PROPELLERS_LEAVE_OUT, type PropellerLine } from '../report/turning/propellers.ts';
import { TETHER } from '../report/turning/turnCautions.ts';
import type { TurnReport } from '../report/turning/turnReport.ts';
import type { TurnVerdict } from '../report/turning/turnVerdicts.ts';
import { formatQuantity } from '../units/format.ts';
import type { UnitSystem } from '../units/units.ts';
import { figures } from './figures.ts';
import { left, oneLine, right, wrapped } from './layout.ts';

interface Asked {
  readonly units: UnitSystem;
  /** m/s; null when it was not asked for. */
  readonly speed: number | null;
  readonly all: boolean;
}

/** What stands only in the whole report. */
const REST =
  /^(glide|drag|power|inflow|added|inertia)\.|^turn\.(share|virtual|widest|radiusLengths|drift|vector|needed|gust(Moment|Thrust|Vector|Arm)$)|Couple$|^climb\.(path|pitch)/;

export function turnText(craft: Craft, first: readonly string[], report: TurnReport, asked: Asked): string {
  const { headline, costWords, verdicts, rows, notes, propellers, cautions } = report;
  const { units, all } = asked;
  const lines = [
    ...wrapped(craft.name || 'Craft without a name'),
    ...first,
    ...wrapped([headline, ...costWords].join(' ')),
    '',
    ...(verdicts.length > 0 ? ['Verdicts', ...verdicts.flatMap(verdictLines), ''] : []),
    ...figures(told(rows, all, report.turn !== null), units),
    ...(all ? propellerTable(propellers, units) : []),
    ...(notes.length > 0 ? ['Notes', ...notes.flatMap(bullet), ''] : []),
    'Cautions',
    ...[...tooFast(rows, asked), ...cautions, ...hazardsOf(craft), TETHER].flatMap(bullet),
    ...(all
      ? []
      : ['', ...wrapped('More with --all: needs, shares, couples, drag, power, propellers, air, inertia.')]),
  ];
  return `${lines.join('\n')}\n`;
}

/** Without thrust the headline says why most figures are missing: only what there is is told. */
function told(rows: Rows, all: boolean, driven: boolean): Rows {
  const entries = Object.entries(rows)
    .filter(([key, { value }]) => (driven ? all || !REST.test(key) : value !== null))
    .map(([key, row]) => ({ key, row }));
  return Object.fromEntries(noneOnce(entries).map(({ key, row }) => [key, row]));
}

function tooFast(rows: Rows, { speed, units }: Asked): string[] {
  const top = rows['speed.top']?.value ?? null;
  if (speed === null || top === null || speed <= top) return [];
  const words = (value: number) => formatQuantity(value, 'speed', units);
  return [
    `--speed: ${words(speed)} is faster than its top speed of ${words(top)}; figures from cruise are of a speed that it does not reach.`,
  ];
}

function verdictLines({ need, ...verdict }: TurnVerdict): string[] {
  const { state, title, word, figure, target, marginWords } = verdict;
  const cells = [left(state, 8), `${left(title, 19)} `, left(word, 20), figure];
  const by = marginWords && `: ${marginWords}`;
  return [
    oneLine(`  ${cells.join('')}`).trimEnd(),
    ...wrapped(`wanted ${target}${by}`, 10),
    ...need.flatMap((each) => wrapped(each, 10)),
  ];
}

function propellerTable(lines: readonly PropellerLine[], units: UnitSystem): string[] {
  if (lines.length === 0) return [];
  const row = (name: string, ...cells: readonly string[]) =>
    oneLine(`  ${left(name, 21)}${cells.map((cell) => right(cell, 11)).join('')}`).trimEnd();
  return [
    'Propellers: ideal power for the same thrust, and that over today’s',
    row('', 'discs', 'at rest', 'over', 'at top', 'over'),
    ...lines.map(({ name, area, atRest, atRestOverToday, atTop, atTopOverToday }) =>
      row(
        name,
        ...[area, atRest, atRestOverToday, atTop, atTopOverToday].map((each) => rowText(each, units)),
      ),
    ),
    ...wrapped(PROPELLERS_LEAVE_OUT, 2),
    '',
  ];
}

const bullet = (sentence: string): string[] =>
  wrapped(sentence, 4).map((line, i) => (i === 0 ? `  - ${line.slice(4)}` : line));
