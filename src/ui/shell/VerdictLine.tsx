/** The line at the bottom: stability, sizes, algebraic loops, the self-check, and the standing caution. */

import { lazy, Suspense } from 'react';
import type { SelfCheck, UncheckedDerivation } from '../../compile/index.ts';
import type { Warning } from '../../problem/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { selfCheckText, sizesText, stabilityText } from './verdict-texts.ts';

const theme = (state: State) => state.view.theme;
const results = (state: State) => state.results;
const isRequiring = (state: State) => state.document.diagram.requirements !== undefined;

export function VerdictLine() {
  const { status, derivation, selfCheck, poles, cuts, problems, stopped } = useStore(results);
  return (
    <footer className="verdict">
      {stopped !== null && <span className="verdict-stability verdict-wrong">{stopped}</span>}
      {stopped === null && status === 'pending' && <span className="verdict-stability">Deriving…</span>}
      {stopped === null && status === 'failed' && (
        <span className="verdict-stability verdict-wrong">No model: {problems[0]?.message}</span>
      )}
      {stopped === null && derivation !== null && (
        <>
          <StabilityWord answer={poles} />
          <span>{sizesText(derivation.model)}</span>
          <LoopCount derivation={derivation} />
          <FirstCut answer={cuts} />
          <RequirementCount />
          <WarningCount warnings={[...derivation.warnings, ...(poles?.warnings ?? [])]} />
          <CheckFigure selfCheck={selfCheck} />
        </>
      )}
      <ThemeChoice />
      <button type="button" className="quiet verdict-caution" onClick={() => actions.openDialog('caution')}>
        linear model: verify on the machine before use
      </button>
    </footer>
  );
}

function StabilityWord({ answer }: { readonly answer: State['results']['poles'] }) {
  if (answer === null) return <span className="verdict-stability">…</span>;
  const tone = answer.stability.verdict === 'stable' ? 'verdict-proved' : 'verdict-wrong';
  return <span className={`verdict-stability ${tone}`}>{stabilityText(answer.stability)}</span>;
}

function LoopCount({ derivation }: { readonly derivation: UncheckedDerivation }) {
  const { loops } = derivation;
  if (loops.length === 0) return <span>no algebraic loop</span>;
  const text = loops.length === 1 ? '1 algebraic loop, solved' : `${loops.length} algebraic loops, solved`;
  return (
    <button
      type="button"
      className="quiet verdict-loop"
      onClick={() => actions.selectBlocks(loops.flatMap(({ blocks }) => blocks))}
    >
      {text}
    </button>
  );
}

/** Loaded once a drawing has a cut. */
const CutMargin = lazy(() => import('./CutMargin.tsx').then(file => ({ default: file.CutMargin })));

function FirstCut({ answer }: { readonly answer: State['results']['cuts'] }) {
  const [first] = answer?.cuts ?? [];
  if (first === undefined) return null;
  return (
    <Suspense>
      <CutMargin cut={first} />
    </Suspense>
  );
}

/** Loaded once a drawing requires something. */
const RequirementVerdict = lazy(() =>
  import('../requirements/index.ts').then(room => ({ default: room.RequirementVerdict })),
);

function RequirementCount() {
  if (!useStore(isRequiring)) return null;
  return (
    <Suspense>
      <RequirementVerdict />
    </Suspense>
  );
}

function WarningCount({ warnings }: { readonly warnings: readonly Warning[] }) {
  if (warnings.length === 0) return null;
  return (
    <button
      type="button"
      className="quiet"
      title={warnings.map(({ message }) => message).join('\n')}
      onClick={() => actions.selectBlocks(warnings.flatMap(({ blocks }) => blocks))}
    >
      {warnings.length === 1 ? '1 warning' : `${warnings.length} warnings`}
    </button>
  );
}

function CheckFigure({ selfCheck }: { readonly selfCheck: SelfCheck | null }) {
  if (selfCheck === null) return <span className="verdict-check">being checked against the drawing…</span>;
  return <span className={`verdict-check ${selfCheck.passed ? '' : 'verdict-wrong'}`}>{selfCheckText(selfCheck)}</span>;
}

const NEXT_THEME = { system: 'light', light: 'dark', dark: 'system' } as const;

/** The sheet's own colours: as the system says, or always light or dark. */
function ThemeChoice() {
  const chosen = useStore(theme) ?? 'system';
  const next = NEXT_THEME[chosen];
  return (
    <button
      type="button"
      className="quiet verdict-caution"
      aria-label={`Colours: ${chosen}. Change to ${next}.`}
      onClick={() => actions.setTheme(next === 'system' ? null : next)}
    >
      colours: {chosen}
    </button>
  );
}
