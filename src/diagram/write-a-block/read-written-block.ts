/**
 * Text of the write-a-block line to a block, as one writes it on paper: `3.5` or `K_p` a gain, `1/s omega` an integrator
 * with its state's name, `+-` a summing point, `(s+2)/(s+5)` a transfer function, `r>` an input, `>y` an output.
 */

import { hasLaplaceVariable, namesIn, parameterNameFault, parseExpression, print } from '../../expression/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import type {
  GainBlock,
  InputBlock,
  IntegratorBlock,
  OutputBlock,
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
  | Omit<TransferFunctionBlock, 'id'>;

/** The block that was written and the parameter names it uses, in order of appearance. */
export interface ReadBlock {
  readonly block: WrittenBlock;
  readonly names: readonly string[];
}

const TERMINAL_NAME = /^[A-Za-z][A-Za-z0-9_.]*$/;
const SUMMING_POINT = /^[+-](?:\s*[+-]){0,15}$/;
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
