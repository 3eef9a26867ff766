/** `carry`: what can be carried where, as a table along a line and a table of the useful loads. */
import type { Craft } from '../craft/craft.ts';
import type { LinearSolver } from '../numeric/linearProgram/result.ts';
import { type CarryCurve, type CarryLine, carryCurve } from '../physics/ballast/carry.ts';
import { type CarryTable, carryTable, type LoadRow } from '../physics/ballast/carryTable.ts';
import { formatQuantity } from '../units/format.ts';
import { inUnits } from '../units/sentence.ts';
import type { UnitSystem } from '../units/units.ts';
import { EXIT, type ExitCode } from './io.ts';
import { left, oneLine, right, wrapped } from './layout.ts';
import { jsonText } from './plan.ts';

export interface CarryAsked {
  readonly json: boolean;
  readonly units: UnitSystem;
  /** keel, axis, or the id of a hardpoint. */
  readonly line: string;
}

export interface CarryAnswer {
  readonly text: string;
  readonly exitCode: ExitCode;
}

/** Exit 2 when there is no such line, 1 when nothing at all can hang on it. */
export function carry(craft: Craft, solver: LinearSolver, { json, units, line }: CarryAsked): CarryAnswer {
  const along = lineOf(craft, line);
  if (!along) return { text: noLine(craft, line), exitCode: EXIT.bad };
  const curve = carryCurve(craft, solver, along);
  if (curve.status === 'infeasible') {
    return {
      text: `${oneLine(inUnits(`${curve.why} ${curve.remedy}`, units)).trim()}\n`,
      exitCode: EXIT.bad,
    };
  }
  const table = carryTable(craft, solver);
  const text = json ? carryJson(curve.value, table) : carryText(craft, curve.value, table, units);
  return { text, exitCode: curve.value.points.some(({ mass }) => mass !== null) ? EXIT.fine : EXIT.misses };
}

function lineOf(craft: Craft, line: string): CarryLine | null {
  if (line === 'keel' || line === 'axis') return { kind: line };
  return Object.hasOwn(craft.hardpoints.byId, line) ? { kind: 'hardpoint', hardpoint: line } : null;
}

const noLine = (craft: Craft, line: string): string =>
  `${oneLine(`--line: found ${JSON.stringify(line)}; allowed: keel, axis, ${craft.hardpoints.order.join(', ')}`)}\n`;

const carryJson = ({ line, points, complete }: CarryCurve, table: CarryTable): string =>
  jsonText({
    carry: {
      line: line.kind === 'hardpoint' ? line.hardpoint : line.kind,
      points: points.map(({ station, place, mass, deadBallast, proven }) => ({
        station,
        place,
        mass,
        deadBallast,
        proven,
      })),
      complete,
      loads: table.rows,
      loadsComplete: table.complete,
    },
  });

function carryText(
  craft: Craft,
  { points, complete }: CarryCurve,
  table: CarryTable,
  units: UnitSystem,
): string {
  // Every tenth station: a terminal shows eleven lines, JSON has them all.
  const shown = points.filter((_, i) => i % 10 === 0);
  const lines = [
    ...wrapped(craft.name || 'Craft without a name'),
    'The most useful load that can hang at each station, the rest planned anew',
    row('station', 'load', 'dead ballast'),
    ...shown.map(({ station, mass, deadBallast }) =>
      row(formatQuantity(station, 'length', units), grams(mass, units), grams(deadBallast, units)),
    ),
    ...(complete ? [] : ['Time ran out before the tail.']),
    ...loadLines(craft, table, units),
  ];
  return `${lines.join('\n')}\n`;
}

const row = (...cells: readonly string[]): string =>
  oneLine(`  ${cells.map((cell) => right(cell, 14)).join('')}`);

const grams = (mass: number | null, units: UnitSystem): string =>
  mass === null ? 'none' : formatQuantity(mass, 'mass', units);

function loadLines(craft: Craft, { rows, complete }: CarryTable, units: UnitSystem): string[] {
  if (rows.length === 0) return [];
  const line = (name: string, ...cells: readonly string[]) =>
    oneLine(`  ${left(name, 30)}${cells.map((cell) => right(cell, 14)).join('')}`);
  const loadLine = ({ load, without, with: withIt, saved }: LoadRow) =>
    line(
      craft.loads.byId[load]!.name || load,
      grams(without, units),
      grams(withIt, units),
      grams(saved, units),
    );
  return [
    '',
    'Dead ballast without each load, with it, and what it saves',
    line('', 'without', 'with', 'saved'),
    ...rows.map(loadLine),
    ...(complete ? [] : ['Time ran out before the last load.']),
  ];
}
