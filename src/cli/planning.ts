/** `plan` and `carry` from file to streams: read the craft, load the solver, tell what comes of it. */
import type { Command } from './args.ts';
import { carry } from './carry.ts';
import { EXIT, type ExitCode, type Io } from './io.ts';
import { oneLine } from './layout.ts';
import { plan } from './plan.ts';
import { readCraft } from './readCraft.ts';

type Asked<K extends Command['kind']> = Extract<Command, { kind: K }>;

export async function planned(asked: Asked<'plan'>, io: Io): Promise<ExitCode> {
  const read = readCraft(asked.file, asked.units, io);
  if (!read) return EXIT.bad;
  const { text, exitCode, file } = plan(read.craft, await io.solver(), asked);
  io.write(text);
  return asked.write !== null && file !== null && !written(asked.write, file, io) ? EXIT.bad : exitCode;
}

function written(path: string, text: string, io: Io): boolean {
  try {
    io.writeText(path, text);
    return true;
  } catch (error) {
    io.error(`${oneLine(`${path}: cannot be written: ${(error as Error).message}`)}\n`);
    return false;
  }
}

export async function carried(asked: Asked<'carry'>, io: Io): Promise<ExitCode> {
  const read = readCraft(asked.file, asked.units, io);
  if (!read) return EXIT.bad;
  const { text, exitCode } = carry(read.craft, await io.solver(), asked);
  if (exitCode === EXIT.bad) io.error(text);
  else io.write(text);
  return exitCode;
}
