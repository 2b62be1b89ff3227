/** The chosen channel's transfer function in symbols: a quotient of polynomials in s. */

import type { Symbols } from '../../worker/index.ts';
import { useAnswer } from '../answers/index.ts';
import { CopyFormula, FormulaView } from '../figures/index.ts';
import { PanelEmpty, PanelPending } from '../results/index.ts';
import { type State, useStore } from '../store/index.ts';

const expanded = (state: State) => state.view.expanded;
const isMoving = (state: State) => state.live !== null;

const model = (state: State) => state.results.derivation?.model ?? null;

/** Characters of a numerator or denominator that stand on one line. */
const LONGEST_LINE = 48;

interface SymbolicTransferProps {
  /** By the names of its input and output. */
  readonly channel: { readonly input: string; readonly output: string };
}

export function SymbolicTransfer({ channel }: SymbolicTransferProps) {
  const known = useStore(model);
  const input = known?.inputs.findIndex(({ name }) => name === channel.input) ?? 0;
  const output = known?.outputs.findIndex(({ name }) => name === channel.output) ?? 0;
  const isExpanded = useStore(expanded);
  const isStill = !useStore(isMoving);
  const { answer } = useAnswer('symbols', { expanded: isExpanded, channel: { input, output } }, isStill);
  if (answer === null) return <PanelPending label="Transfer function" />;
  if (answer.transfer === null) return <PanelEmpty>{answer.note}</PanelEmpty>;
  const { numerator, denominator } = answer.transfer;
  const isWhole = denominator.text === '1';
  const right = isWhole ? numerator.mathml : `<mfrac>${numerator.mathml}${denominator.mathml}</mfrac>`;
  const mathml = `<mrow><mi>G</mi><mo>(</mo><mi>s</mi><mo>)</mo><mo>=</mo>${right}</mrow>`;
  const text = isWhole ? numerator.text : `(${numerator.text})/(${denominator.text})`;
  const latex = `G(s) = ${isWhole ? numerator.latex : `\\frac{${numerator.latex}}{${denominator.latex}}`}`;
  return (
    <div className="transfer-function symbolic-transfer">
      <div className="transfer-function-formula">
        {Math.max(numerator.text.length, denominator.text.length) <= LONGEST_LINE ? (
          <FormulaView mathml={mathml} text={text} isBlock />
        ) : (
          <Lines numerator={numerator} denominator={denominator} />
        )}
      </div>
      <CopyFormula latex={latex} mathml={`<math display="block">${mathml}</math>`} />
    </div>
  );
}

type WrittenPolynomial = NonNullable<Symbols['transfer']>['numerator'];

/** Numerator and denominator on lines of their own, which break between terms. */
function Lines({
  numerator,
  denominator,
}: {
  readonly numerator: WrittenPolynomial;
  readonly denominator: WrittenPolynomial;
}) {
  const line = (letter: string, { terms, text }: WrittenPolynomial) => (
    <p className="transfer-function-line">
      <FormulaView mathml={`<mrow><mi>${letter}</mi><mo>(</mo><mi>s</mi><mo>)</mo><mo>=</mo></mrow>`} text={text} />
      {terms.map(term => (
        <span key={term} className="polynomial-term">
          <FormulaView mathml={`<mrow>${term}</mrow>`} text={text} />
        </span>
      ))}
    </p>
  );
  return (
    <>
      <p className="transfer-function-note">G(s) = N(s) / D(s)</p>
      {line('N', numerator)}
      {line('D', denominator)}
    </>
  );
}
