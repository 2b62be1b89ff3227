/** Edits of cuts, and what becomes of them when their wire is moved or goes. */

import { fail, ok, problem, type Result } from '../../problem/index.ts';
import type { Cut, Diagram, PortReference } from '../types.ts';
import type { AddCut, RemoveCut, SheetEdit } from './edit.ts';

const isSamePort = (a: PortReference, b: PortReference) => a[0] === b[0] && a[1] === b[1];

/** Cuts the wire to an input port of the top sheet; the same diagram where it is cut already. */
export function addCut(diagram: Diagram, { to }: AddCut): Result<Diagram> {
  if (!diagram.wires.some(wire => isSamePort(wire.to, to))) {
    const message = `No wire leads to input ${to[1]} of ${to[0]}. Choose one that is there.`;
    return fail(problem('missing-port', message, { blocks: [to[0]] }));
  }
  const { cuts = [] } = diagram;
  if (cuts.some(cut => isSamePort(cut.to, to))) return ok(diagram);
  return ok({ ...diagram, cuts: [...cuts, { to }] });
}

/** Closes the wire again; the same diagram where it has no cut. */
export function removeCut(diagram: Diagram, { to }: RemoveCut): Result<Diagram> {
  return ok(
    withCuts(
      diagram,
      diagram.cuts?.filter(cut => !isSamePort(cut.to, to)),
    ),
  );
}

/** The diagram after an edit of a sheet: a cut goes along with its wire's end, and goes where its wire has gone. */
export function withCutsOnWires(diagram: Diagram, edit: SheetEdit): Diagram {
  const { cuts, wires } = diagram;
  if (cuts === undefined || (edit.at ?? []).length > 0) return diagram;
  const isMove = edit.kind === 'moveWireEnd' && !isSamePort(edit.to, edit.newTo);
  const moved = isMove
    ? cuts
        .filter(({ to }) => !isSamePort(to, edit.newTo))
        .map(cut => (isSamePort(cut.to, edit.to) ? { ...cut, to: edit.newTo } : cut))
    : cuts;
  const ends = new Set(wires.map(({ to }) => to.join(' ')));
  return withCuts(
    diagram,
    moved.filter(({ to }) => ends.has(to.join(' '))),
  );
}

/** The same diagram where the cuts are as many and the same list. */
function withCuts(diagram: Diagram, cuts: readonly Cut[] | undefined): Diagram {
  const isSame = cuts?.length === diagram.cuts?.length && cuts?.every((cut, k) => cut === diagram.cuts?.[k]) !== false;
  if (isSame) return diagram;
  const { cuts: _, ...rest } = diagram;
  return cuts === undefined || cuts.length === 0 ? rest : { ...rest, cuts };
}
