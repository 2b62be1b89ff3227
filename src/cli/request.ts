/**
 * The arguments of the command line, read into one request. First of the stages: nothing is opened here. Every refusal is a
 * `bad-option` that names the argument and what would do.
 */

import { DEFAULT_SAMPLES, MOST_SAMPLES } from '../analysis/index.ts';
import { FORMATS, type Format, type Notation } from '../deliver/index.ts';
import { nearestName } from '../expression/index.ts';
import { fail, ok, problem, type Result } from '../problem/index.ts';
import { isLink } from '../share/index.ts';

export type Request =
  | { readonly command: 'help' }
  | { readonly command: 'version' }
  | {
      readonly command: 'check';
      readonly source: string;
      /** Whether every requirement is judged over the whole tolerance of the parameters. */
      readonly tolerances: boolean;
      readonly samples: number;
      readonly seed: number;
    }
  | { readonly command: 'link'; readonly source: string }
  | {
      readonly command: 'derive';
      readonly source: string;
      readonly format: Format;
      readonly notation: Notation;
      /** Whether symbols write derived parameters out. */
      readonly expanded: boolean;
      /** Whether the model is reduced to the fewest states with the same transfer functions. */
      readonly minimal: boolean;
      /** A path; null for standard output. */
      readonly out: string | null;
      /** Parameters to replace, in the order given; the last one of a name holds. */
      readonly settings: readonly Setting[];
    };

export interface Setting {
  readonly name: string;
  readonly value: string;
}

const COMMANDS = ['derive', 'check', 'link'] as const;
const OPTIONS_OF = {
  derive: ['--as', '--out', '--notation', '--expand', '--minimal', '--set'],
  check: ['--tolerances', '--samples', '--seed'],
  link: [],
} as const;
const WITHOUT_VALUE = ['--expand', '--minimal', '--tolerances', '--help', '--version'] as const;
const OPTIONS = [...OPTIONS_OF.derive, ...OPTIONS_OF.check, '--help', '--version'] as const;
const NOTATIONS: readonly Notation[] = ['symbols', 'fractions', 'decimals'];

/** Options in the order given, and what is no option. */
interface Split {
  readonly options: readonly { readonly name: (typeof OPTIONS)[number]; readonly value: string }[];
  readonly operands: readonly string[];
}

/** The request that the arguments (without the program's own name) make. */
export function readRequest(argv: readonly string[]): Result<Request> {
  const split = splitArguments(argv);
  if (!split.ok) return split;
  const { options, operands } = split.value;
  if (options.some(({ name }) => name === '--help')) return ok({ command: 'help' });
  if (options.some(({ name }) => name === '--version')) return ok({ command: 'version' });
  const [name, source, ...more] = operands;
  if (name === undefined) return refuse('No command is given. Write derive, check or link; --help tells more.');
  const command = COMMANDS.find(known => known === name);
  if (command === undefined) return refuse(`There is no command "${name}". ${suggestion(name, COMMANDS)}`);
  if (source === undefined) return refuse(`${command} needs a drawing. Write a file, a share link or - after it.`);
  if (more.length > 0) return refuse(`${command} takes one drawing, and "${more[0]}" is one too many. Leave it out.`);
  const foreign = options.find(({ name: option }) => !OPTIONS_OF[command].some(known => known === option));
  if (foreign !== undefined) {
    const owner = COMMANDS.find(each => OPTIONS_OF[each].some(known => known === foreign.name)) ?? 'derive';
    return refuse(`${command} takes no ${foreign.name}. Only ${owner} does.`);
  }
  if (command === 'derive') return deriveRequest(source, options);
  if (command === 'check') return checkRequest(source, options);
  if (command === 'link' && isLink(source))
    return refuse('link makes a link of a file or of -, and this is one already.');
  return ok({ command, source });
}

function splitArguments(argv: readonly string[]): Result<Split> {
  const options: Split['options'][number][] = [];
  const operands: string[] = [];
  for (let i = 0; i < argv.length; i++) {
    const argument = argv[i] ?? '';
    if (argument === '--') {
      operands.push(...argv.slice(i + 1));
      break;
    }
    if (argument === '-' || !argument.startsWith('-')) {
      operands.push(argument);
      continue;
    }
    const [written = '', ...rest] = argument.split('=');
    const name = OPTIONS.find(known => known === written);
    if (name === undefined) {
      const nearest = nearestName(written, OPTIONS);
      const way = nearest === null ? '--help lists them.' : `Did you mean ${nearest}?`;
      return refuse(`There is no option ${written}. ${way}`);
    }
    const attached = rest.length > 0 ? rest.join('=') : null;
    const takesValue = !WITHOUT_VALUE.some(known => known === name);
    if (!takesValue && attached !== null) return refuse(`${name} takes no value. Leave out "=${attached}".`);
    const value = !takesValue ? '' : (attached ?? argv[++i]);
    if (value === undefined) return refuse(`${name} needs a value after it. ${VALUES_OF[name] ?? ''}`.trim());
    options.push({ name, value });
  }
  return ok({ options, operands });
}

const VALUES_OF: Readonly<Partial<Record<string, string>>> = {
  '--as': `Write one of ${alternatives(FORMATS.map(({ id }) => id))}.`,
  '--out': 'Write the path of the file to write.',
  '--notation': `Write ${alternatives(NOTATIONS)}.`,
  '--set': 'Write NAME=EXPR, for instance Kp=2/3.',
  '--samples': 'Write how many points to draw at random.',
  '--seed': 'Write a whole number; the same one gives the same points.',
};

/** Seeds that the generator takes: 1 to 2³¹ − 2. */
const LARGEST_SEED = 2 ** 31 - 2;

function checkRequest(source: string, options: Split['options']): Result<Request> {
  const samples = wholeNumber(options, '--samples', DEFAULT_SAMPLES, 0, MOST_SAMPLES);
  if (!samples.ok) return samples;
  const seed = wholeNumber(options, '--seed', 1, 1, LARGEST_SEED);
  if (!seed.ok) return seed;
  const tolerances = options.some(({ name }) => name === '--tolerances');
  return ok({ command: 'check', source, tolerances, samples: samples.value, seed: seed.value });
}

function wholeNumber(
  options: Split['options'],
  option: string,
  absent: number,
  least: number,
  most: number,
): Result<number> {
  const text = options.findLast(({ name }) => name === option)?.value;
  if (text === undefined) return ok(absent);
  const value = /^\d+$/.test(text) ? Number(text) : Number.NaN;
  if (value >= least && value <= most) return ok(value);
  return refuse(`${option} "${text}" is no whole number from ${least} to ${most}.`);
}

function deriveRequest(source: string, options: Split['options']): Result<Request> {
  const last = (name: string) => options.findLast(option => option.name === name)?.value;
  const id = last('--as') ?? 'model';
  const format = FORMATS.find(known => known.id === id);
  if (format === undefined) {
    const ids = FORMATS.map(known => known.id);
    return refuse(`There is no format "${id}". ${suggestion(id, ids)}`);
  }
  const written = last('--notation') ?? 'fractions';
  const notation = NOTATIONS.find(known => known === written);
  if (notation === undefined) return refuse(`There is no notation "${written}". ${suggestion(written, NOTATIONS)}`);
  const settings: Setting[] = [];
  for (const { value } of options.filter(({ name }) => name === '--set')) {
    const [name, expression] = halves(value);
    if (name === '' || expression === '') {
      return refuse(`--set "${value}" sets nothing. Write NAME=EXPR, for instance Kp=2/3.`);
    }
    settings.push({ name, value: expression });
  }
  const expanded = options.some(option => option.name === '--expand');
  const minimal = options.some(option => option.name === '--minimal');
  return ok({ command: 'derive', source, format, notation, expanded, minimal, out: last('--out') ?? null, settings });
}

/** What stands before and after the first equals sign; the second is empty where there is none. */
function halves(text: string): readonly [string, string] {
  const at = text.indexOf('=');
  return at < 0 ? [text.trim(), ''] : [text.slice(0, at).trim(), text.slice(at + 1).trim()];
}

/** `Did you mean derive?`, or where nothing is near all there is: `Write derive, check or link.` */
function suggestion(word: string, known: readonly string[]): string {
  const nearest = nearestName(word, known);
  if (nearest !== null) return `Did you mean ${nearest}?`;
  return `Write ${alternatives(known)}.`;
}

function alternatives(words: readonly string[]): string {
  return `${words.slice(0, -1).join(', ')} or ${words.at(-1) ?? ''}`;
}

function refuse(message: string): Result<never> {
  return fail(problem('bad-option', message));
}
