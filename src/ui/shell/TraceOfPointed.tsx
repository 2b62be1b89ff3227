/** The room under the system matrix for what is said of the entry, block or wire that is pointed at: always as high, loaded when needed. */

import { lazy, Suspense, useRef } from 'react';
import type { StateSpace } from '../../compile/index.ts';
import { type State, useStore } from '../store/index.ts';

const TraceLine = lazy(() => import('../trace/index.ts').then(room => ({ default: room.TraceLine })));

const isPointing = ({ pointing: { entry, part } }: State) => entry !== null || part !== null;

export function TraceOfPointed({ model }: { readonly model: StateSpace }) {
  const pointing = useStore(isPointing);
  const hasPointed = useRef(false);
  hasPointed.current ||= pointing;
  return (
    <div className="trace-line">
      {hasPointed.current ? (
        <Suspense>
          <TraceLine model={model} />
        </Suspense>
      ) : (
        <p className="trace-hint">Point at an entry to see the action paths that make it.</p>
      )}
    </div>
  );
}
