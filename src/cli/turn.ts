/** `turn FILE`: how a craft turns, flies and climbs by its thrusters, for reading or as JSON. */
import { type Craft, listed } from '../craft/craft.ts';
import type { Vectoring } from '../craft/thrustSchema.ts';
import { type PlanFound, planOf } from '../physics/ballast/plan.ts';
import { planReport } from '../report/planReport.ts';
import { plannedWords } from '../report/planWords.ts';
import { turnReport } from '../report/turning/turnReport.ts';
import { formatQuantity } from '../units/format.ts';
import { inUnits } from '../units/sentence.ts';
import type { Command } from './args.ts';
import { rowsJson } from './balance.ts';
import { EXIT, type ExitCode, type Io } from './io.ts';
import { oneLine, wrapped } from './layout.ts';
import { readCraft } from './readCraft.ts';
import { turnText } from './turnText.ts';

type Asked = Extract<Command, { kind: 'turn' }>;

/** Exit 1 when a turning target is missed, nothing is known of any thruster, or no plan can be made that is asked for. */
export function turned(asked: Asked, io: Io): ExitCode | Promise<ExitCode> {
  const read = readCraft(asked.file, asked.units, io);
  if (!read) return EXIT.bad;
  const { craft } = read;
  const wrong = vectorTrouble(craft, asked.vector);
  if (wrong) {
    io.error(`${oneLine(wrong)}\n`);
    return EXIT.bad;
  }
  return asked.planned ? turnedAsPlanned(craft, asked, io) : told(craft, null, asked, io);
}

async function turnedAsPlanned(craft: Craft, asked: Asked, io: Io): Promise<ExitCode> {
  const { json, units } = asked;
  const plan = planOf(craft, await io.solver(), { explain: false, units });
  if (!('why' in plan)) return told(craft, plan, asked, io);
  const why = planReport(craft, plan, units).headline;
  const said = `There is no ballast plan to carry out. ${why} The command plan tells what would help.`;
  const text = [...wrapped(craft.name || 'Craft without a name'), ...wrapped(said)].join('\n');
  io.write(json ? rowsJson({}, { plan: { status: plan.status, why } }) : `${text}\n`);
  return EXIT.misses;
}

/** Of the craft as it is, or as planned. */
function told(craft: Craft, plan: PlanFound | null, asked: Asked, io: Io): ExitCode {
  const { json, units } = asked;
  const report = turnReport(plan?.craft ?? craft, asked, units);
  const first = plan ? wrapped(inUnits(plannedWords(craft, plan), units)) : [];
  io.write(json ? rowsJson(report.rows, plan ? planHead(plan) : {}) : turnText(craft, first, report, asked));
  return report.turn && report.met ? EXIT.fine : EXIT.misses;
}

const planHead = ({ status, deadBallast }: PlanFound) => ({ plan: { status, deadBallast } });

/** Why no thruster, or not every one, can be turned to that angle in yaw; null when all that turn can. */
function vectorTrouble(craft: Craft, vector: number | null): string | null {
  if (vector === null) return null;
  const found = `--vector: found ${degrees(vector)}`;
  const able = listed(craft.parts).filter(({ thruster }) => thruster && turns(thruster.yaw));
  if (able.length === 0) return `${found}; but no thruster of this craft turns in yaw`;
  const out = able.find(
    ({ thruster }) => vector < thruster!.yaw.least - DUST || vector > thruster!.yaw.most + DUST,
  );
  if (!out) return null;
  const { least, most } = out.thruster!.yaw;
  return `${found}; allowed: ${degrees(least)} to ${degrees(most)}, the limits in yaw of ${out.name || out.kind}`;
}

/** Degrees as typed are no whole number of radians. */
const DUST = 1e-9;

const turns = ({ least, most, slew }: Vectoring): boolean => most > least && slew > 0;

const degrees = (angle: number): string => formatQuantity(angle, 'angle', 'metric');
