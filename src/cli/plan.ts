/** `plan`: the ballast plan of a craft, for reading or as JSON, and the craft with the plan carried out. */
import type { Craft } from '../craft/craft.ts';
import { serialize } from '../craft/serialize.ts';
import type { LinearSolver } from '../numeric/linearProgram/result.ts';
import { type Plan, planOf } from '../physics/ballast/plan.ts';
import { assess } from '../report/assess.ts';
import { planJson } from '../report/planJson.ts';
import { type PlanReport, planReport } from '../report/planReport.ts';
import type { Rows } from '../report/rows.ts';
import { rowText } from '../report/rowText.ts';
import { formatNumber } from '../units/format.ts';
import type { UnitSystem } from '../units/units.ts';
import { EXIT, type ExitCode } from './io.ts';
import { left, oneLine, wrapped } from './layout.ts';

export interface PlanAsked {
  readonly robust: boolean;
  readonly json: boolean;
  readonly units: UnitSystem;
  /** s */
  readonly timeLimit: number;
}

export interface PlanAnswer {
  /** For standard output. */
  readonly text: string;
  readonly exitCode: ExitCode;
  /** The craft file with the plan carried out, for --write; null without a plan. */
  readonly file: string | null;
}

export function plan(craft: Craft, solver: LinearSolver, asked: PlanAsked): PlanAnswer {
  const { robust, json, units, timeLimit } = asked;
  const made = planOf(craft, solver, { robust, timeLimit, units });
  const text = json ? jsonText(planJson(craft, made, units)) : planText(craft, made, units);
  return 'why' in made
    ? { text, exitCode: EXIT.misses, file: null }
    : { text, exitCode: EXIT.fine, file: serialize(made.craft) };
}

export const jsonText = (value: unknown): string => `${JSON.stringify(value, null, 2)}\n`;

function planText(craft: Craft, made: Plan, units: UnitSystem): string {
  const report = planReport(craft, made, units);
  const lines = [
    ...wrapped(craft.name || 'Craft without a name'),
    ...wrapped(report.headline),
    ...wrapped(report.proof),
    ...listed('What to do', report.steps),
    ...sideBySide(craft, report, units),
    ...proofLines(made),
    ...listed(
      'What stands in the way of less',
      report.binding.map(({ sentence }) => sentence),
    ),
    ...listed(
      'What would help',
      report.remedies.map(({ sentence }) => sentence),
    ),
    ...listed('Cautions', report.cautions),
  ];
  return `${lines.join('\n')}\n`;
}

const listed = (title: string, sentences: readonly string[]): string[] =>
  sentences.length > 0 ? ['', title, ...sentences.flatMap(bullet)] : [];

const bullet = (sentence: string): string[] =>
  wrapped(sentence, 4).map((line, i) => (i === 0 ? `  - ${line.slice(4)}` : line));

const COMPARED = [
  'heaviness',
  'mass.solid',
  'cg.station',
  'float.pitch',
  'float.heel',
  'float.pendulumDepth',
];

function sideBySide(craft: Craft, { after }: PlanReport, units: UnitSystem): string[] {
  if (!after) return [];
  const today: Rows = assess(craft, units).rows;
  const line = (label: string, a: string, b: string) =>
    oneLine(`  ${left(label, 30)}${left(a, 22)}${b}`).trimEnd();
  return [
    '',
    line('', 'today', 'planned'),
    ...COMPARED.map((key) =>
      line(today[key]!.label, rowText(today[key]!, units), rowText(after[key]!, units)),
    ),
  ];
}

/** How far the proof goes. */
function proofLines(made: Plan): string[] {
  if ('why' in made) return made.remediesComplete ? [] : ['', 'Time ran out before every change was tried.'];
  const gap = Number.isFinite(made.gap) ? `${formatNumber(100 * made.gap, 2)} %` : 'not known';
  return [
    '',
    made.status === 'optimal' ? 'Proven: gap 0.' : `Stopped before the proof: gap ${gap}.`,
    ...(made.wishesProven ? [] : ['The wishes after least ballast were not searched to their end.']),
    ...(made.bindingComplete ? [] : ['Time ran out before every limit was tried.']),
  ];
}
