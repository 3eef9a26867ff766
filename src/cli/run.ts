/** The commands of the terminal, free of the process they run in. */
import { commandOf } from './args.ts';
import { balance } from './balance.ts';
import { check } from './check.ts';
import { HELP } from './help.ts';
import { EXIT, type ExitCode, type Io } from './io.ts';
import { oneLine } from './layout.ts';
import { placed } from './place.ts';
import { carried, planned } from './planning.ts';
import { turned } from './turn.ts';

/** Runs what the arguments ask for. Returns the exit code: 0 fine, 1 the craft misses its targets, 2 bad input or use. */
export function run(args: readonly string[], io: Io): ExitCode | Promise<ExitCode> {
  const command = commandOf(args);
  switch (command.kind) {
    case 'balance':
      return balance(command, io);
    case 'check':
      return check(command.files, io);
    case 'plan':
      return planned(command, io);
    case 'carry':
      return carried(command, io);
    case 'turn':
      return turned(command, io);
    case 'place':
      return placed(command, io);
    case 'help':
      io.write(HELP);
      return EXIT.fine;
    case 'version':
      io.write(`${io.version}\n`);
      return EXIT.fine;
    case 'misuse':
      io.error(`${oneLine(command.why)}. Try: npm run -s craft -- help\n`);
      return EXIT.bad;
  }
}
