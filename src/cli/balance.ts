/** `balance FILE`: the whole report, for reading or as JSON. */
import type { Rows } from '../report/rows.ts';
import type { UnitSystem } from '../units/units.ts';
import { EXIT, type ExitCode, type Io } from './io.ts';
import { readCraft } from './readCraft.ts';
import { reportText } from './reportText.ts';

interface Asked {
  readonly file: string;
  readonly json: boolean;
  readonly units: UnitSystem;
}

export function balance({ file, json, units }: Asked, io: Io): ExitCode {
  const read = readCraft(file, units, io);
  if (!read) return EXIT.bad;
  const { craft, report } = read;
  io.write(json ? rowsJson(report.rows) : reportText(craft, report, units));
  return report.met ? EXIT.fine : EXIT.misses;
}

/** Values in SI whatever the units; these only change the sentences in `why`. `before`: what the object holds besides. */
export function rowsJson(rows: Rows, before: object = {}): string {
  const entries = Object.entries(rows).map(([key, { value, unit, uncertainty, status, why }]) => [
    key,
    { value, unit, ...(uncertainty === undefined ? {} : { uncertainty }), status, why },
  ]);
  return `${JSON.stringify({ ...before, rows: Object.fromEntries(entries) }, null, 2)}\n`;
}
