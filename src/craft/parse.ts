/** The one loading gate: text becomes a craft, or a list of problems. Nothing is loaded in part. */
import { z } from 'zod';
import { type Craft, craftOf } from './craft.ts';
import { foundText, type Problem, pathText } from './problem.ts';
import { referenceProblems } from './references.ts';
import { craftFileSchema } from './schema.ts';
import { stepUp } from './versions.ts';

export type Parsed =
  | { readonly ok: true; readonly craft: Craft }
  | { readonly ok: false; readonly problems: Problem[] };

const MOST_CHARACTERS = 8_000_000;
const MOST_PROBLEMS = 100;
const LONGEST_NAME = 60;

/** A craft from the text of a craft file. Never throws. */
export function parse(text: string): Parsed {
  if (text.length > MOST_CHARACTERS) {
    return refuse('', `${text.length} characters`, `a craft file of at most ${MOST_CHARACTERS} characters`);
  }
  let json: unknown;
  try {
    json = JSON.parse(text);
  } catch (error) {
    return refuse('', `text that is not JSON (${(error as Error).message})`, 'a craft file in JSON');
  }
  return parseJson(json);
}

/** The same from a value that JSON.parse gave. */
export function parseJson(json: unknown): Parsed {
  if (json === null || typeof json !== 'object' || Array.isArray(json)) {
    return refuse('', foundText(json), 'an object with the fields of a craft file');
  }
  const stepped = stepUp(json as Record<string, unknown>);
  if ('problem' in stepped) return { ok: false, problems: [stepped.problem] };
  const checked = craftFileSchema.safeParse(stepped.file);
  if (!checked.success) {
    return {
      ok: false,
      problems: limited(
        named(
          checked.error.issues.flatMap((issue) => problemsOf(issue, stepped.file).map(orNull(issue.path))),
          stepped.file,
        ),
      ),
    };
  }
  const problems = referenceProblems(checked.data);
  return problems.length
    ? { ok: false, problems: limited(named(problems, stepped.file)) }
    : { ok: true, craft: craftOf(checked.data) };
}

const refuse = (path: string, found: string, allowed: string): Parsed => ({
  ok: false,
  problems: [{ path, found, allowed }],
});

/** Each problem with the name of the part, run or hardpoint it is in: a builder knows those, not their place in a list. */
const named = (problems: Problem[], file: Record<string, unknown>): Problem[] =>
  problems.map((problem) => {
    const [, list, index] = /^(\w+)\[(\d+)\]/.exec(problem.path) ?? [];
    const name = list && valueAt(file, [list, Number(index), 'name']);
    return typeof name === 'string' && name ? { name: name.slice(0, LONGEST_NAME), ...problem } : problem;
  });

function limited(problems: Problem[]): Problem[] {
  if (problems.length <= MOST_PROBLEMS) return problems;
  const rest = problems.length - MOST_PROBLEMS;
  return [
    ...problems.slice(0, MOST_PROBLEMS),
    { path: '', found: `${rest} more problems`, allowed: 'none; mend the first ones and try again' },
  ];
}

/** What zod found, in our words: for every gate of the program. */
export function problemsOf(issue: z.core.$ZodIssue, file: unknown): Problem[] {
  const path = pathText(issue.path);
  const found = foundText(valueAt(file, issue.path));
  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.map((key) => ({
        path: pathText([...issue.path, key]),
        found: `an unknown field ${foundText(key)}`,
        allowed: 'only the fields of the craft file’s schema',
      }));
    case 'invalid_union':
      return [{ path, found, allowed: unionText(issue) }];
    default:
      return [{ path, found, allowed: allowedText(issue) }];
  }
}

/** Where a field may be null that is said too: a thruster of which nothing is known has `null`, not nothing. */
const orNull =
  (path: readonly PropertyKey[]) =>
  (problem: Problem): Problem =>
    schemaAt(path) instanceof z.ZodNullable
      ? { ...problem, allowed: `${problem.allowed}, or null` }
      : problem;

function schemaAt(path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>((at, key) => {
    if (at instanceof z.ZodArray) return at.element;
    return at instanceof z.ZodObject ? at.shape[key as string] : undefined;
  }, craftFileSchema);
}

function valueAt(file: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, key) =>
      value !== null && typeof value === 'object' && Object.hasOwn(value, key)
        ? (value as Record<PropertyKey, unknown>)[key]
        : undefined,
    file,
  );
}

const unionText = (issue: z.core.$ZodIssueInvalidUnion): string =>
  'options' in issue && Array.isArray(issue.options)
    ? `one of ${issue.options.map(String).join(', ')}`
    : 'one of the forms in the schema';

const TYPE_WORDS: Readonly<Record<string, string>> = {
  object: 'an object with its fields',
  array: 'a list',
  string: 'text',
  number: 'a finite number',
  int: 'a whole number',
  boolean: 'true or false',
};

const typeWord = (type: string): string => TYPE_WORDS[type] ?? type;

function allowedText(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case 'invalid_type':
      return typeWord(issue.expected);
    case 'too_small':
      return boundText('least', issue.origin, issue.minimum, issue.inclusive ?? true);
    case 'too_big':
      return boundText('most', issue.origin, issue.maximum, issue.inclusive ?? true);
    case 'invalid_value':
      return issue.values.length === 1
        ? `only ${foundText(issue.values[0])}`
        : `one of ${issue.values.map((value) => String(value)).join(', ')}`;
    case 'invalid_format':
      return 'lower-case letters, digits and hyphens, starting with a letter, at most 48 characters';
    default:
      return issue.message;
  }
}

function boundText(
  side: 'least' | 'most',
  origin: string,
  bound: number | bigint,
  inclusive: boolean,
): string {
  const noun = origin === 'array' ? ' entries' : origin === 'string' ? ' characters' : '';
  const word = inclusive ? `at ${side}` : side === 'least' ? 'more than' : 'less than';
  return `${word} ${bound}${noun}`;
}
