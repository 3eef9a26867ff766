/** From the name of a craft file to a craft whose hull can be formed, or lines on standard error that say why not. */
import type { Craft } from '../craft/craft.ts';
import { parse } from '../craft/parse.ts';
import { problemText } from '../craft/problem.ts';
import { assess } from '../report/assess.ts';
import type { Assessment } from '../report/assessment.ts';
import type { UnitSystem } from '../units/units.ts';
import type { Io } from './io.ts';
import { oneLine } from './layout.ts';

export interface Read {
  readonly craft: Craft;
  readonly report: Assessment;
}

/** Null when there is none; everything that is wrong has then been told. */
export function readCraft(file: string, units: UnitSystem, io: Io): Read | null {
  const name = file === '-' ? 'standard input' : file;
  const tell = (what: string) => io.error(`${oneLine(`${name}: ${what}`)}\n`);
  const text = textOf(file, tell, io);
  if (text === null) return null;
  const parsed = parse(text);
  if (!parsed.ok) {
    for (const problem of parsed.problems) tell(problemText(problem));
    return null;
  }
  const report = assess(parsed.craft, units);
  if (report.geometry.status === 'infeasible') {
    tell(`hull.shape: ${report.headline}`);
    return null;
  }
  return { craft: parsed.craft, report };
}

const REASONS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file',
  EISDIR: 'it is a folder',
  EACCES: 'this user may not read it',
};

function textOf(file: string, tell: (what: string) => void, io: Io): string | null {
  try {
    return io.readText(file);
  } catch (error) {
    const { code = '', message } = error as NodeJS.ErrnoException;
    tell(`cannot be read: ${REASONS[code] ?? message}`);
    return null;
  }
}
