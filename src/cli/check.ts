/** `check FILE...`: whether each is a craft file whose hull can be formed. Targets are no part of it. */
import { EXIT, type ExitCode, type Io } from './io.ts';
import { oneLine } from './layout.ts';
import { readCraft } from './readCraft.ts';

export function check(files: readonly string[], io: Io): ExitCode {
  let code: ExitCode = EXIT.fine;
  for (const file of files) {
    const read = readCraft(file, 'metric', io);
    if (read) io.write(`${oneLine(`${file}: a craft file in order: ${read.craft.name}`)}\n`);
    else code = EXIT.bad;
  }
  return code;
}
