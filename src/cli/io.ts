import type { LinearSolver } from '../numeric/linearProgram/result.ts';

/** What a command may do to the world outside; the shell hands in the real one, tests their own. */
export interface Io {
  /** Of the program. */
  readonly version: string;
  /** The text of a file, or of standard input for "-". Throws as node:fs does. */
  readText(path: string): string;
  /** Puts a text into a file. Throws as node:fs does. */
  writeText(path: string, text: string): void;
  /** The solver of linear programs, loaded on the first need. */
  solver(): Promise<LinearSolver>;
  write(text: string): void;
  error(text: string): void;
}

export const EXIT = { fine: 0, misses: 1, bad: 2 } as const;
export type ExitCode = (typeof EXIT)[keyof typeof EXIT];
