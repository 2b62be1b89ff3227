/** Workings with every coefficient printed, for the notations that they are written in. */

import { rationalField, toDouble, toFraction } from '../../algebra/index.ts';
import {
  createSymbolicField,
  Effort,
  formulaOf,
  formulaText,
  type RationalFunction,
} from '../../algebra/symbolic/index.ts';
import type { UncheckedDerivation } from '../../compile/index.ts';
import { exactWorkings, MOST_SIGNALS, symbolicWorkings, type WorkingSection } from '../../compile/workings/index.ts';
import { toLatex, toMathML } from '../../expression/index.ts';
import type { ModelContext } from '../format.ts';
import { symbolLatex, symbolMathml } from '../written-symbols.ts';

/** A coefficient's absolute part, in three notations. */
export interface WrittenCoefficient {
  readonly text: string;
  readonly latex: string;
  readonly mathml: string;
  /** Whether it is put in parentheses before a name. */
  readonly isSum: boolean;
}

export interface WrittenTerm {
  readonly isNegative: boolean;
  /** Null for one. */
  readonly coefficient: WrittenCoefficient | null;
  readonly of: string;
}

export interface WrittenLine {
  readonly left: string;
  readonly isDerivative: boolean;
  readonly terms: readonly WrittenTerm[];
}

export interface WrittenSection {
  readonly title: string;
  readonly remarks: readonly string[];
  readonly lines: readonly WrittenLine[];
}

export interface WrittenWorkings {
  readonly sections: readonly WrittenSection[];
  /** Why there are none, or why they are not in the notation that was asked for; empty where there is nothing to say. */
  readonly note: string;
}

/** What workings are written from; they do not wait for the check. */
export interface WorkingsContext extends Omit<ModelContext, 'derivation'> {
  readonly derivation: UncheckedDerivation;
}

/** In the notation of the context; numbers where formulas would be too long. */
export function writtenWorkings({
  diagram,
  derivation,
  notation,
  expanded = false,
  minimal,
}: WorkingsContext): WrittenWorkings {
  if (minimal !== undefined)
    return { sections: [], note: 'Workings are of the whole drawing, not of the minimal model.' };
  if (derivation.route === 'double') return { sections: [], note: TOO_LARGE };
  const symbolic = notation === 'symbols' ? symbolicWorkings(diagram, expanded) : null;
  const workings = symbolic ?? exactWorkings(diagram);
  if (workings === null) return { sections: [], note: TOO_LARGE };
  if (workings.field === 'symbolic') {
    const options = { declared: diagram.parameters.map(({ name }) => name), effort: new Effort() };
    const print = (value: RationalFunction) => {
      const formula = formulaOf(value, options);
      return coefficientOf(formulaText(formula), symbolLatex(formula), symbolMathml(formula));
    };
    const { negate } = createSymbolicField();
    return { sections: workings.sections.map(each => written(each, print, negate)), note: '' };
  }
  const isDecimal = notation === 'decimals' || derivation.model.irrational.length > 0;
  const sections = workings.sections.map(each =>
    written(
      each,
      value => {
        const text = isDecimal ? String(toDouble(value)) : toFraction(value);
        return coefficientOf(text, toLatex(text), toMathML(text));
      },
      rationalField.negate,
    ),
  );
  return { sections, note: notation === 'symbols' ? 'The formulas are too long to be of use: these are numbers.' : '' };
}

const TOO_LARGE = `Workings are written for drawings of up to ${MOST_SIGNALS} signals that are derived exactly.`;

const TITLES = {
  drawing: 'As read off the drawing',
  solution: 'Its solution',
  substitution: 'Other signals by substitution',
  differentiation: 'Before the differentiations are reduced',
  result: 'Result',
} as const;

function written<T>(
  { kind, lines, remarks }: WorkingSection<T>,
  print: (value: T) => WrittenCoefficient,
  negate: (value: T) => T,
): WrittenSection {
  const termOf = (value: T, of: string): WrittenTerm => {
    const whole = print(value);
    const isNegative = !whole.isSum && whole.text.startsWith('-');
    const coefficient = isNegative ? print(negate(value)) : whole;
    return { isNegative, coefficient: coefficient.text === '1' ? null : coefficient, of };
  };
  const title = kind === 'loop' ? `Algebraic loop of ${lines.map(({ left }) => left).join(', ')}` : TITLES[kind];
  return {
    title,
    remarks,
    lines: lines.map(({ left, isDerivative, terms }) => ({
      left,
      isDerivative,
      terms: terms.map(({ coefficient, of }) => termOf(coefficient, of)),
    })),
  };
}

function coefficientOf(text: string, latex: string, mathml: string): WrittenCoefficient {
  return { text, latex, mathml, isSum: hasOuterSum(text) };
}

/** Whether a plus or minus between spaces stands outside all parentheses. */
function hasOuterSum(text: string): boolean {
  let depth = 0;
  for (let i = 0; i < text.length; i++) {
    const sign = text.charAt(i);
    if (sign === '(') depth += 1;
    if (sign === ')') depth -= 1;
    if (depth === 0 && i > 0 && (sign === '+' || sign === '-') && text.charAt(i - 1) === ' ') return true;
  }
  return false;
}
