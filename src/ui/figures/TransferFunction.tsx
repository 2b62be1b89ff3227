/**
 * A transfer function on the screen. What it says, in every notation, is made in transfer-function-view.ts; here only the
 * layout is chosen by the width there is.
 */

import { useMemo } from 'react';
import { CopyFormula } from './CopyFormula.tsx';
import { MarkupView } from './MarkupView.tsx';
import { WrappedTerms } from './Polynomial.tsx';
import { leadIn } from './polynomial-markup.ts';
import type { Notation } from './polynomial-terms.ts';
import type { Real } from './rounded-digits.ts';
import { type TransferFunctionView, transferFunctionView } from './transfer-function-view.ts';
import { useContainerWidth } from './useContainerWidth.ts';

interface TransferFunctionProps {
  /** In descending powers, exact or doubles. */
  readonly numerator: readonly Real[];
  readonly denominator: readonly Real[];
  readonly notation: Notation;
  readonly name?: string;
  readonly variable?: string;
}

/** CSS pixels of one em of `.transfer-function` in figures.css, and of the copy button beside the formula. */
const EM = 18;
const BUTTON = 72;

/** `G(s) = N/D`: one fraction where it fits its container, otherwise N and D on lines of their own that wrap. */
export function TransferFunction(props: TransferFunctionProps) {
  const { numerator, denominator, notation, name = 'G', variable = 's' } = props;
  const { ref, width } = useContainerWidth<HTMLDivElement>();
  const view = useMemo(
    () => transferFunctionView(name, numerator, denominator, notation, variable),
    [name, numerator, denominator, notation, variable],
  );
  const fits = width === 0 || view.ems * EM <= width - BUTTON;
  return (
    <div className="transfer-function" ref={ref}>
      <div className="transfer-function-formula">
        {fits ? <MarkupView tree={view.formula} /> : <Lines view={view} name={name} variable={variable} />}
      </div>
      <CopyFormula latex={view.latex} mathml={view.mathml} />
    </div>
  );
}

interface LinesProps {
  readonly view: TransferFunctionView;
  readonly name: string;
  readonly variable: string;
}

function Lines({ view, name, variable }: LinesProps) {
  const sign = view.isRounded ? ' is about ' : ' equals ';
  const line = (letter: string, terms: TransferFunctionView['numerator']) => (
    <WrappedTerms
      terms={terms}
      variable={variable}
      leadIn={leadIn(letter, variable, view.isRounded)}
      leadInWords={`${letter} of ${variable}${sign}`}
    />
  );
  if (!view.isQuotient) return line(name, view.numerator);
  return (
    <>
      <p className="transfer-function-note">
        {name}({variable}) = N({variable}) / D({variable})
      </p>
      <p className="transfer-function-line">{line('N', view.numerator)}</p>
      <p className="transfer-function-line">{line('D', view.denominator)}</p>
    </>
  );
}
