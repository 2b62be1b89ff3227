/** The sentence of a trace: entry, value, and the paths and loops that make it. */

import { Fragment } from 'react';
import type { StateSpace } from '../../compile/index.ts';
import type { Trace, TracedStep, TracedValue } from '../../compile/trace/index.ts';
import type { MatrixPlace } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { EntryName } from './EntryName.tsx';
import { FormulaLine } from './FormulaLine.tsx';
import { numberText, stepsOf, symbolsOf, waysText } from './trace-words.ts';

type Traced = Extract<Trace, { readonly outcome: 'traced' }>;

interface TraceWordsProps {
  readonly model: StateSpace;
  readonly place: MatrixPlace;
  readonly trace: Trace;
  readonly isKept: boolean;
}

export function TraceWords({ model, place, trace, isKept }: TraceWordsProps) {
  const isTraced = trace.outcome === 'traced';
  return (
    <section
      className={isKept ? 'trace-words trace-words-kept' : 'trace-words'}
      aria-label="Trace of the entry"
      // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls has to be reached by key
      tabIndex={0}
    >
      <p className="trace-sentence">
        <strong className="trace-value">
          <EntryName model={model} place={place} />
          {isTraced && ' : '}
          {isTraced && <Value value={trace.value} />}
        </strong>{' '}
        {isTraced ? waysText(trace) : trace.reason}
        {isTraced && !isKept && hasParts(trace) && ' (click or Enter: each of them)'}
        {isTraced && <OnlyPath trace={trace} />}
        {isKept && (
          <button type="button" className="quiet trace-let-go" onClick={() => actions.leaveEntry('escape')}>
            let go
          </button>
        )}
      </p>
      {isTraced && isKept && <Parts trace={trace} />}
    </section>
  );
}

/** The steps of the path where there is just one. */
function OnlyPath({ trace: { paths, from } }: { readonly trace: Traced }) {
  const [path, ...others] = paths;
  if (path === undefined || others.length > 0) return null;
  return (
    <>
      : <Steps steps={stepsOf(from, path)} />
    </>
  );
}

/** Whether there is more to list than one path. */
function hasParts({ paths, loops }: Traced): boolean {
  return paths.length > 1 || (paths.length > 0 && loops.length > 0);
}

/** The paths, where there is more than one, and the loops. */
function Parts({ trace }: { readonly trace: Traced }) {
  const { paths, loops, determinant, from } = trace;
  return (
    <>
      {paths.length > 1 && (
        <ol className="trace-parts" aria-label="Paths">
          {paths.map((path, k) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: paths of one trace never move
            <li key={k}>
              <Value value={path.product} />
              {!isOne(path.cofactor) && ' · cofactor '}
              {!isOne(path.cofactor) && <Value value={path.cofactor} />}
              {' along '}
              <Steps steps={stepsOf(from, path)} />
            </li>
          ))}
        </ol>
      )}
      {loops.length > 0 && paths.length > 0 && (
        <p className="trace-determinant">
          determinant <Value value={determinant} />; loop gains{' '}
          {loops.map((loop, k) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: loops of one trace never move
            <Fragment key={k}>
              {k > 0 && '; '}
              <Value value={loop.product} /> (<Steps steps={loop.steps} />)
            </Fragment>
          ))}
        </p>
      )}
    </>
  );
}

function isOne({ exact }: TracedValue): boolean {
  return exact.n === 1n && exact.d === 1n;
}

const isDecimal = (state: State) => state.view.notation === 'decimals';

function Value({ value }: { readonly value: TracedValue }) {
  const inDecimals = useStore(isDecimal);
  const symbols = symbolsOf(value);
  return (
    <span className="trace-figure">
      {symbols !== null && <FormulaLine text={symbols} />}
      {symbols !== null && ' = '}
      {numberText(value, inDecimals)}
    </span>
  );
}

function Steps({ steps }: { readonly steps: readonly TracedStep[] }) {
  return (
    <span className="trace-steps">
      {steps.map(({ word, math }, k) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: steps of one path never move
        <Fragment key={k}>
          {k > 0 && ' → '}
          {word}
          {word !== '' && math !== '' && ' '}
          {math !== '' && <FormulaLine text={math} />}
        </Fragment>
      ))}
    </span>
  );
}
