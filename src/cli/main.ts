/** The shell over `run`: real arguments, files, streams and exit code. */
import { readFileSync, writeFileSync } from 'node:fs';
import { loadHighs } from '../numeric/linearProgram/highsSolver.ts';
import { run } from './run.ts';

// Whoever reads the output may stop early, as `head` does; that is no fault of ours.
for (const stream of [process.stdout, process.stderr]) {
  stream.on('error', (error: NodeJS.ErrnoException) =>
    process.exit(error.code === 'EPIPE' ? process.exitCode : 2),
  );
}

const manifest = new URL('../../package.json', import.meta.url);

process.exitCode = await run(process.argv.slice(2), {
  version: JSON.parse(readFileSync(manifest, 'utf8')).version,
  readText: (path) => new TextDecoder().decode(readFileSync(path === '-' ? 0 : path)),
  writeText: (path, text) => writeFileSync(path, text),
  solver: () => loadHighs(),
  write: (text) => process.stdout.write(text),
  error: (text) => process.stderr.write(text),
});
