/** Polynomials and transfer functions as MathML (W3C MathML Core), before there is any DOM. */

import { MINUS } from './format.ts';
import { element, type Markup } from './markup.ts';
import type { Term } from './polynomial-terms.ts';

/** MathML's names: mi an identifier, mn a number, mo an operator. */
const number = (text: string): Markup => element('mn', {}, text);
const operator = (text: string, attributes: Readonly<Record<string, string>> = {}): Markup =>
  element('mo', attributes, text);

/** One `mrow` a term, each with the sign in front of it, so that a long polynomial can break between terms. */
export function termRows(terms: readonly Term[], variable: string): readonly Markup[] {
  return terms.map((term, index) => element('mrow', {}, ...signOf(term, index === 0), ...factorsOf(term, variable)));
}

/** The whole polynomial as one `mrow`. */
export function polynomialRow(terms: readonly Term[], variable: string): Markup {
  return element('mrow', {}, ...termRows(terms, variable));
}

/** N over D as one `mfrac`, or N alone where D is one. */
export function quotientRow(numerator: readonly Term[], denominator: readonly Term[], variable: string): Markup {
  const top = polynomialRow(numerator, variable);
  return isOne(denominator) ? top : element('mfrac', {}, top, polynomialRow(denominator, variable));
}

/** Whether the terms say 1. */
export function isOne(terms: readonly Term[]): boolean {
  const [term, ...others] = terms;
  return (
    others.length === 0 &&
    term?.power === 0 &&
    !term.isNegative &&
    term.magnitude.kind === 'figure' &&
    term.magnitude.figure.mantissa === '1' &&
    term.magnitude.figure.exponent === null
  );
}

/** `G(s) =`, with ≈ where what follows is rounded. */
export function leadIn(name: string, variable: string, isRounded: boolean): Markup {
  return element(
    'mrow',
    {},
    element('mi', {}, name),
    operator('(', { stretchy: 'false', lspace: '0.05em' }),
    element('mi', {}, variable),
    operator(')', { stretchy: 'false' }),
    operator(isRounded ? '≈' : '='),
  );
}

/** A `math` element that says `label` to whoever cannot see it. */
export function mathElement(label: string, display: 'inline' | 'block', ...children: readonly Markup[]): Markup {
  return element('math', { display, 'aria-label': label }, ...children);
}

function signOf({ isNegative }: Term, isFirst: boolean): readonly Markup[] {
  if (!isFirst) return [operator(isNegative ? MINUS : '+', { form: 'infix' })];
  return isNegative ? [operator(MINUS, { form: 'prefix' })] : [];
}

function factorsOf({ magnitude, power }: Term, variable: string): readonly Markup[] {
  const base = element('mi', {}, variable);
  const raisedBase = power === 1 ? base : element('msup', {}, base, number(String(power)));
  const powers = power === 0 ? [] : [raisedBase];
  switch (magnitude.kind) {
    case 'one':
      return powers;
    case 'fraction': {
      const fraction = element('mfrac', {}, number(magnitude.numerator), number(magnitude.denominator));
      return power === 0 ? [fraction] : [fraction, thinSpace(), ...powers];
    }
    case 'figure': {
      const { mantissa, exponent } = magnitude.figure;
      const scale = exponent === null ? [] : [operator('×'), powerOfTen(exponent)];
      const coefficient = [number(mantissa), ...scale];
      return power === 0 ? coefficient : [...coefficient, thinSpace(), ...powers];
    }
    default:
      return magnitude satisfies never;
  }
}

function powerOfTen(exponent: number): Markup {
  const magnitude = number(String(Math.abs(exponent)));
  const sign = exponent < 0 ? [operator(MINUS, { form: 'prefix' })] : [];
  return element('msup', {}, number('10'), element('mrow', {}, ...sign, magnitude));
}

/** A third of an em would part a coefficient from its power; a sixth is TeX's thin space (3/18 em). */
function thinSpace(): Markup {
  return element('mspace', { width: '0.167em' });
}
