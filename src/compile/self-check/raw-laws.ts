/**
 * What each block says about its signals, in doubles and straight from format.md: the self-check's own reading, which takes
 * nothing from the realizations under test. A group is its sheet, so it says nothing itself.
 */

import type { Block, DelayBlock, Quantity, StateModelBlock, TransferFunctionBlock } from '../../diagram/index.ts';
import { evaluatePolynomial, evaluateQuantity, type Scope } from '../../expression/index.ts';
import type { Jitter } from './random.ts';

/**
 * `static`: y = gains u. `rational`: y = N(s) / D(s) u, coefficients ascending, D monic. `matrices`: the block's own A, B,
 * C and D.
 */
export type RawLaw =
  | { readonly kind: 'static'; readonly gains: readonly (readonly number[])[] }
  | { readonly kind: 'dead-time'; readonly seconds: number }
  | { readonly kind: 'rational'; readonly numerator: readonly number[]; readonly denominator: readonly number[] }
  | {
      readonly kind: 'matrices';
      readonly A: readonly (readonly number[])[];
      readonly B: readonly (readonly number[])[];
      readonly C: readonly (readonly number[])[];
      readonly D: readonly (readonly number[])[];
    };

const UNITY: RawLaw = { kind: 'static', gains: [[1]] };

/** How a delay is read: as the approximant that the model holds, or as the dead time itself. */
export type DeadTime = 'approximated' | 'true';

/** The law of a block whose fields compile has already read without a problem. */
export function rawLaw(block: Block, scope: Scope, deadTimes: DeadTime): RawLaw {
  switch (block.kind) {
    case 'gain':
      return { kind: 'static', gains: [[numberOf(block.gain, scope)]] };
    case 'summer':
      return { kind: 'static', gains: [[...block.signs].map(sign => (sign === '+' ? 1 : -1))] };
    case 'integrator':
      return { kind: 'rational', numerator: [1], denominator: [0, 1] };
    case 'differentiator':
      return { kind: 'rational', numerator: [0, 1], denominator: [1] };
    case 'transfer-function':
      return quotient(block, scope);
    case 'delay':
      if (deadTimes === 'true') return { kind: 'dead-time', seconds: numberOf(block.time, scope) };
      return approximant(block, scope);
    case 'state-model':
      return ownMatrices(block, scope);
    case 'limiter':
    case 'input':
    case 'output':
    case 'group':
      return UNITY;
    default:
      return block satisfies never;
  }
}

/** How many states a law has. */
export function stateCount(law: RawLaw): number {
  if (law.kind === 'static' || law.kind === 'dead-time') return 0;
  return law.kind === 'rational' ? law.denominator.length - 1 : law.A.length;
}

/** Whether a law differentiates its input. */
export function isImproper(law: RawLaw): boolean {
  return law.kind === 'rational' && law.numerator.length > law.denominator.length;
}

function numberOf(text: Quantity, scope: Scope): number {
  const plain = Number(text);
  if (text !== '' && Number.isFinite(plain)) return plain;
  const value = evaluateQuantity(text, scope);
  if (!value.ok) throw new Error(`the self-check met a quantity that compile should have refused: ${text}`);
  return value.value.double;
}

function quotient({ numerator, denominator }: TransferFunctionBlock, scope: Scope): RawLaw {
  const top = coefficients(numerator, scope);
  const bottom = coefficients(denominator, scope);
  const leading = bottom.at(-1) ?? 1;
  return {
    kind: 'rational',
    numerator: top.map(c => c / leading),
    denominator: bottom.map(c => c / leading),
  };
}

/** Ascending. */
function coefficients(text: Quantity, scope: Scope): number[] {
  const polynomial = evaluatePolynomial(text, scope);
  if (!polynomial.ok) throw new Error(`the self-check met a polynomial that compile should have refused: ${text}`);
  return polynomial.value.map(({ double }) => double).reverse();
}

/**
 * The diagonal Padé approximant of exp(−sT) as θ_N(−x) / θ_N(x), x = sT/2, by the reverse Bessel polynomials
 * θ_k = (2k − 1) θ_{k−1} + x² θ_{k−2}, θ_0 = 1, θ_1 = x + 1 (Grosswald 1978, Bessel Polynomials, chapter 2).
 */
function approximant({ time, order = 2 }: DelayBlock, scope: Scope): RawLaw {
  const half = numberOf(time, scope) / 2;
  if (half === 0) return UNITY;
  let before = [1];
  let theta = [1, 1];
  for (let k = 2; k <= order; k++) {
    const next = new Array<number>(k + 1).fill(0);
    theta.forEach((c, i) => {
      next[i]! += (2 * k - 1) * c;
    });
    before.forEach((c, i) => {
      next[i + 2]! += c;
    });
    before = theta;
    theta = next;
  }
  const inS = theta.map((c, i) => c * half ** (i - order)); // monic: θ is, in x
  return { kind: 'rational', numerator: inS.map((c, i) => (i % 2 === 0 ? c : -c)), denominator: inS };
}

function ownMatrices(block: StateModelBlock, scope: Scope): RawLaw {
  const read = (rows: StateModelBlock['A']) => rows.map(row => row.map(text => numberOf(text, scope)));
  return { kind: 'matrices', A: read(block.A), B: read(block.B), C: read(block.C), D: read(block.D) };
}

/** The law with every coefficient multiplied by a factor of its own; the leading one of a denominator stays 1. */
export function jittered(law: RawLaw, jitter: Jitter): RawLaw {
  const row = (values: readonly number[]) => values.map(value => value * jitter());
  switch (law.kind) {
    case 'static':
      return { kind: 'static', gains: law.gains.map(row) };
    case 'dead-time':
      return law;
    case 'rational':
      return {
        kind: 'rational',
        numerator: row(law.numerator),
        denominator: [...row(law.denominator.slice(0, -1)), ...law.denominator.slice(-1)],
      };
    case 'matrices':
      return { kind: 'matrices', A: law.A.map(row), B: law.B.map(row), C: law.C.map(row), D: law.D.map(row) };
    default:
      return law satisfies never;
  }
}
