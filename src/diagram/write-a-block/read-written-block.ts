/**
 * Text of the write-a-block line to a block, as one writes it on paper: `3.5` or `K_p` a gain, `1/s omega` an integrator
 * with its state's name, `+-` a summing point, `(s+2)/(s+5)` a transfer function, `r>` an input, `>y` an output, `s` a
 * differentiator, `e^(-T*s)` a dead time, `-1 .. 1` a limiter, `K_x = 3.5` a gain whose parameter is given its value.
 */

import { hasLaplaceVariable, namesIn, parameterNameFault, parseExpression, print } from '../../expression/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import type {
  DelayBlock,
  DifferentiatorBlock,
  GainBlock,
  InputBlock,
  IntegratorBlock,
  LimiterBlock,
  OutputBlock,
  Parameter,
  SummerBlock,
  TransferFunctionBlock,
} from '../types.ts';
import { quotientOf } from './quotient.ts';

/** A block with no id and no place yet. */
export type WrittenBlock =
  | Omit<InputBlock, 'id'>
  | Omit<OutputBlock, 'id'>
  | Omit<GainBlock, 'id'>
  | Omit<SummerBlock, 'id'>
  | Omit<IntegratorBlock, 'id'>
  | Omit<TransferFunctionBlock, 'id'>
  | Omit<DelayBlock, 'id'>
  | Omit<DifferentiatorBlock, 'id'>
  | Omit<LimiterBlock, 'id'>;

/** The block that was written and the parameter names it uses, in order of appearance. */
export interface ReadBlock {
  readonly block: WrittenBlock;
  readonly names: readonly string[];
  /** The parameter that the line gives a value, as in `K_x = 3.5`; it is among the names too. */
  readonly defines?: Parameter;
}

const TERMINAL_NAME = /^[A-Za-z][A-Za-z0-9_.]*$/;
const SUMMING_POINT = /^[+-](?:\s*[+-]){0,15}$/;
const DEFINITION = /^([A-Za-z][A-Za-z0-9_]*)\s*=\s*(.+)$/;
const DEAD_TIME = /^(?:e\s*\^|exp)\s*\(\s*-\s*(?:(.+?)\s*\*\s*s|s\s*\*\s*(.+?)|s)\s*\)$/;
const LIMITS = /^(.+?)\s*\.\.\s*(.+)$/;
const INTEGRATOR = /^1\s*\/\s*s(?:\s+(\S.*))?$/;

/** Reads one line; the problem says what can be written. */
export function readWrittenBlock(written: string): Result<ReadBlock> {
  const text = written.trim();
  if (text === '') return refuse('Write a block: 3.5, K_p, 1/s, +-, (s+2)/(s+5), r> or >y.');
  if (text.endsWith('>')) return terminal('input', text.slice(0, -1).trim());
  if (text.startsWith('>')) return terminal('output', text.slice(1).trim());
  if (SUMMING_POINT.test(text)) return ok({ block: { kind: 'summer', signs: text.replaceAll(/\s/g, '') }, names: [] });
  const integrator = INTEGRATOR.exec(text);
  if (integrator) return integratorNamed(integrator[1]?.trim());
  if (text === 's') return ok({ block: { kind: 'differentiator' }, names: [] });
  const definition = DEFINITION.exec(text);
  if (definition) return definedGain(definition[1] ?? '', definition[2] ?? '');
  const deadTime = DEAD_TIME.exec(text);
  if (deadTime) {
    const time = deadTime[1] ?? deadTime[2] ?? '1';
    return withQuantities([time], { kind: 'delay', time });
  }
  const [, lower, upper] = LIMITS.exec(text) ?? [];
  if (lower !== undefined && upper !== undefined) {
    return withQuantities([lower, upper], { kind: 'limiter', lower, upper });
  }
  return gainOrTransferFunction(text.replaceAll('[', '(').replaceAll(']', ')'));
}

function terminal(kind: 'input' | 'output', name: string): Result<ReadBlock> {
  if (name === '') return ok({ block: { kind }, names: [] });
  if (!TERMINAL_NAME.test(name)) return refuse(`"${name}" cannot be a signal's name. Use letters, digits and _.`);
  return ok({ block: { kind, name }, names: [] });
}

function integratorNamed(name: string | undefined): Result<ReadBlock> {
  if (name === undefined) return ok({ block: { kind: 'integrator' }, names: [] });
  if (!TERMINAL_NAME.test(name)) return refuse(`"${name}" cannot be a state's name. Use letters, digits and _.`);
  return ok({ block: { kind: 'integrator', name }, names: [] });
}

/** `K_x = 3.5`: the gain K_x, and the value of its parameter. */
function definedGain(name: string, value: string): Result<ReadBlock> {
  const fault = parameterNameFault(name);
  if (fault !== null) return refuse(fault);
  const read = withQuantities([value], { kind: 'gain', gain: name });
  if (!read.ok) return read;
  return ok({ ...read.value, names: [name, ...read.value.names], defines: { name, value } });
}

/** The block with the names in its quantities, or what is wrong with the first bad one. */
function withQuantities(texts: readonly string[], block: WrittenBlock): Result<ReadBlock> {
  const names: string[] = [];
  for (const text of texts) {
    const parsed = parseExpression(text);
    if (!parsed.ok) return parsed;
    if (hasLaplaceVariable(parsed.value)) return refuse(`"${text}" holds s. Write a quantity without it.`);
    const found = namesIn(parsed.value);
    const fault = found.map(parameterNameFault).find(fault => fault !== null);
    if (fault !== undefined) return refuse(fault);
    names.push(...found);
  }
  return ok({ block, names: [...new Set(names)] });
}

function gainOrTransferFunction(text: string): Result<ReadBlock> {
  const parsed = parseExpression(text);
  if (!parsed.ok) return parsed;
  const names = namesIn(parsed.value).filter(name => name !== 's');
  const fault = names.map(parameterNameFault).find(found => found !== null);
  if (fault !== undefined) return refuse(fault);
  if (!hasLaplaceVariable(parsed.value)) return ok({ block: { kind: 'gain', gain: text }, names });
  const quotient = quotientOf(parsed.value);
  if (quotient === null)
    return refuse(`"${text}" is no quotient of polynomials in s. Use + - * / and whole powers of s.`);
  const { numerator, denominator } = quotient;
  return ok({
    block: { kind: 'transfer-function', numerator: print(numerator), denominator: print(denominator) },
    names,
  });
}

function refuse(message: string): Result<never> {
  return fail(problem('bad-expression', message));
}
