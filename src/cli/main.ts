/**
 * The command line: a request is read, a drawing is read, an answer is printed. Everything the machine does goes through
 * `io`. What goes wrong is a line on standard error and an exit status, never a stack trace.
 */

import { version } from '../../package.json';
import { compile } from '../compile/index.ts';
import { minimalDerivation, modelWarnings, oneLine } from '../deliver/index.ts';
import type { Diagram } from '../diagram/index.ts';
import { exitStatus, fail, ok, type Problem, problem, type Result, type Warning } from '../problem/index.ts';
import { encodeLink } from '../share/index.ts';
import { type CheckLine, checkDrawing } from './check.ts';
import type { Io } from './io.ts';
import { readDrawing } from './read-drawing.ts';
import { type Request, readRequest } from './request.ts';
import { withSettings } from './settings.ts';
import { usage } from './usage.ts';

type Derive = Extract<Request, { command: 'derive' }>;
type Check = Extract<Request, { command: 'check' }>;

const DONE = 0;

/** Exit status of a fault of the program itself; 0, 2, 3 and 4 are given to what a user can cause. */
const FAULT = 1;

/**
 * Answers the arguments (without the program's own name).
 *
 * @returns the exit status: 0 done, 2 the input cannot be used, 3 the drawing has no state-space model, 4 a requirement is missed.
 */
export async function main(argv: readonly string[], io: Io): Promise<number> {
  try {
    const request = readRequest(argv);
    const outcome = request.ok ? await answer(request.value, io) : request;
    if (outcome.ok) return outcome.value;
    for (const line of outcome.problems.map(lineOf)) io.complain(line);
    return exitStatus(outcome.problems);
  } catch (fault) {
    const message = oneLine(fault instanceof Error ? fault.message : String(fault));
    io.complain(`poleward: This is a fault of the program, not of the drawing: ${message}. Please report it.`);
    return FAULT;
  }
}

/** The exit status of an answer that was given. */
async function answer(request: Request, io: Io): Promise<Result<number>> {
  switch (request.command) {
    case 'help':
      return printed(usage(), io);
    case 'version':
      return printed(`${version}\n`, io);
    case 'derive':
      return derive(request, io);
    case 'check':
      return check(await readDrawing(request.source, io), request, io);
    case 'link':
      return link(await readDrawing(request.source, io), io);
    default:
      return request satisfies never;
  }
}

async function derive(request: Derive, io: Io): Promise<Result<number>> {
  const { format, out } = request;
  if (format.isBinary && out === null && io.isTerminal) {
    return fail(
      problem('bad-option', `${format.label} is no text for a terminal. Write --out and a file's path after it.`),
    );
  }
  const drawing = await readDrawing(request.source, io);
  const set = drawing.ok ? withSettings(drawing.value, request.settings) : drawing;
  const content = set.ok ? written(set.value, request, io) : set;
  if (!content.ok) return content;
  if (out === null) return printed(content.value, io);
  const replaced = await io.replaceFile(out, content.value);
  return replaced.ok ? ok(DONE) : replaced;
}

function written(
  diagram: Diagram,
  { format, notation, expanded, minimal }: Derive,
  io: Io,
): Result<string | Uint8Array> {
  if (format.scope === 'drawing') return ok(format.write(diagram));
  const derivation = compile(diagram);
  if (!derivation.ok) return derivation;
  const whole = { diagram, derivation: derivation.value, expanded };
  const derived = minimal ? minimalDerivation(whole) : ok(whole);
  if (!derived.ok) return derived;
  // The model file holds its warnings; beside any other format they are said.
  if (format.id !== 'model') {
    for (const line of modelWarnings(derived.value.derivation).map(lineOf)) io.complain(line);
  }
  return ok(format.write({ ...derived.value, notation }));
}

/** Exit status where a requirement of the drawing is missed. */
const MISSED = 4;

async function check(drawing: Result<Diagram>, request: Check, io: Io): Promise<Result<number>> {
  const checked = drawing.ok ? checkDrawing(drawing.value, request) : drawing;
  if (!checked.ok) return checked;
  const { lines, isMissed } = checked.value;
  await io.print(lines.map(line => `${lineOf(line)}\n`).join(''));
  return ok(isMissed ? MISSED : DONE);
}

async function link(drawing: Result<Diagram>, io: Io): Promise<Result<number>> {
  return drawing.ok ? printed(`${encodeLink(drawing.value)}\n`, io) : drawing;
}

async function printed(content: string | Uint8Array, io: Io): Promise<Result<number>> {
  await io.print(content);
  return ok(DONE);
}

/** `poleward: WHAT: message` on one line, whatever a name in it may hold. */
function lineOf({ code, message }: Problem | Warning | CheckLine): string {
  return `poleward: ${code}: ${oneLine(message)}`;
}
