/** `place`: where a thruster had better sit, as a table for reading, as JSON or as CSV. */
import type { Craft } from '../craft/craft.ts';
import type { PlacedPoint } from '../physics/placing/placedPoint.ts';
import { type PlacementStudy, placementStudy, thrusterParts } from '../physics/placing/study.ts';
import { placeCsv } from '../report/turning/placeCsv.ts';
import { PLACE_FIGURES, type PlaceFigure } from '../report/turning/placeFigures.ts';
import { placeJson } from '../report/turning/placeJson.ts';
import { placeReport } from '../report/turning/placeReport.ts';
import { formatNumber } from '../units/format.ts';
import { type UnitSystem, unitOf } from '../units/units.ts';
import type { Command } from './args.ts';
import { EXIT, type ExitCode, type Io } from './io.ts';
import { oneLine, right, wrapped } from './layout.ts';
import { jsonText } from './plan.ts';
import { readCraft } from './readCraft.ts';

type Asked = Extract<Command, { kind: 'place' }>;

/** Exit 2 when there is no such thruster, 1 when neither where it is nor at any station there is both a plan and room for its propeller. */
export async function placed(asked: Asked, io: Io): Promise<ExitCode> {
  const { part, stations, throttle, units } = asked;
  const read = readCraft(asked.file, units, io);
  if (!read) return EXIT.bad;
  const { craft } = read;
  const id = partOf(craft, part);
  if (id === null) return told(partTrouble(craft, part), io);
  const flown = { throttle, vector: null, speed: null };
  const study = placementStudy(craft, id, await io.solver(), { stations, asked: flown });
  if (study.status === 'infeasible') return told(`${study.why} ${study.remedy}`, io);
  io.write(textOf(craft, study.value, asked));
  const { points, today } = study.value;
  return [today, ...points].some(({ best }) => best) ? EXIT.fine : EXIT.misses;
}

function told(trouble: string, io: Io): ExitCode {
  io.error(`${oneLine(trouble).trim()}\n`);
  return EXIT.bad;
}

/** The thruster of that id; else of that name, capitals aside, when only one has it; null when there is none or more. */
function partOf(craft: Craft, typed: string | null): string | null {
  if (typed === null) return null;
  const able = thrusterParts(craft);
  if (able.some(({ id }) => id === typed)) return typed;
  const alike = able.filter(({ name }) => name.toLowerCase() === typed.toLowerCase());
  return alike.length === 1 ? alike[0]!.id : null;
}

function partTrouble(craft: Craft, part: string | null): string {
  const able = thrusterParts(craft);
  const found = part === null ? 'none' : JSON.stringify(part);
  if (able.length === 0) return `--part: found ${found}; but no part of this craft has thrust figures`;
  const words = able.map(({ id, name }) => (name ? `${id} (${name})` : id));
  return `--part: found ${found}; allowed: ${words.join(', ')}`;
}

function textOf(craft: Craft, study: PlacementStudy, { json, csv, units }: Asked): string {
  if (json) return jsonText(placeJson(craft, study, units));
  return csv ? placeCsv(study.points) : placeText(craft, study, units);
}

function placeText(craft: Craft, study: PlacementStudy, units: UnitSystem): string {
  const { headline, obstacles, notes, cautions } = placeReport(craft, study, units);
  const lines = [
    ...wrapped(craft.name || 'Craft without a name'),
    ...wrapped(headline),
    '',
    ...table(study, units),
    ...listOf('Where something is in the way', obstacles),
    ...listOf('Notes', notes),
    ...listOf('Cautions', cautions),
  ];
  return `${lines.join('\n')}\n`;
}

const listOf = (title: string, sentences: readonly string[]): string[] =>
  sentences.length > 0 ? ['', title, ...sentences.flatMap(bullet)] : [];

const bullet = (sentence: string): string[] =>
  wrapped(sentence, 4).map((line, i) => (i === 0 ? `  - ${line.slice(4)}` : line));

/** A terminal shows about this many stations besides those that nothing beats; JSON and CSV have them all. */
const SHOWN = 15;

const COLUMNS = PLACE_FIGURES.filter(({ key }) => key !== 'wireChange');

function table({ points, today }: PlacementStudy, units: UnitSystem): string[] {
  const every = Math.ceil(points.length / SHOWN);
  const shown = points.filter(({ best }, i) => best || i % every === 0 || i === points.length - 1);
  return [
    'Where it could sit: * nothing beats it, ! the propeller strikes something',
    row(
      ' ',
      COLUMNS.map(({ head }) => head),
    ),
    row(
      ' ',
      COLUMNS.map(({ quantity }) => unitOf(quantity, units).symbol),
    ),
    ...shown.map((point) => pointRow(point, units)),
    `Where it is${today.why ? `: ${oneLine(today.why)}` : ''}`,
    pointRow(today, units),
  ];
}

const pointRow = (point: PlacedPoint, units: UnitSystem): string =>
  row(
    point.strikes ? '!' : point.best ? '*' : ' ',
    COLUMNS.map((column) => cellOf(point, column, units)),
  );

/** Without its unit, which stands in the head. */
function cellOf(point: PlacedPoint, { key, quantity }: PlaceFigure, units: UnitSystem): string {
  const unit = unitOf(quantity, units);
  const value = point[key];
  return value === null ? '-' : formatNumber(unit.toDisplay(value), unit.digits);
}

const row = (mark: string, cells: readonly string[]): string =>
  oneLine(`${mark} ${cells.map((cell) => right(cell, 7)).join('')}`).trimEnd();
