/** Edits of wires. A wire is known by the input port it leads to, which takes one wire only. */

import { fail, ok, type Problem, problem, type Result } from '../../problem/index.ts';
import { portCounts } from '../port-counts.ts';
import { wireTitle } from '../reading/index.ts';
import { blockTitle, blockTitleAtStart } from '../titles.ts';
import type { PortReference, Sheet, Wire } from '../types.ts';
import { addBlock, blockOf, checkedName, isTooFar, tooFar } from './block-edits.ts';
import type { Connect, Disconnect, InsertOnWire, MoveWireEnd, NameWire, SetVia } from './edit.ts';

const isSamePort = (a: PortReference, b: PortReference) => a[0] === b[0] && a[1] === b[1];

function wireTo(sheet: Sheet, to: PortReference): Result<Wire> {
  const wire = sheet.wires.find(candidate => isSamePort(candidate.to, to));
  if (wire !== undefined) return ok(wire);
  const message = `No wire leads to input ${to[1]} of ${to[0]}. Choose one that is there.`;
  return fail(problem('missing-port', message, { blocks: [to[0]] }));
}

/** The problem of a wire's end that is not there, null where it is. */
function endFault(sheet: Sheet, port: PortReference, end: 'output' | 'input'): Problem | null {
  const found = blockOf(sheet, port[0]);
  if (!found.ok) return found.problems[0] ?? null;
  const { inputs, outputs } = portCounts(found.value);
  const count = end === 'output' ? outputs : inputs;
  if (Number.isInteger(port[1]) && port[1] >= 0 && port[1] < count) return null;
  const lacks = count === 0 ? `has no ${end}` : `has no ${end} ${port[1]}`;
  const message = `${blockTitleAtStart(found.value)} ${lacks}. Join another port.`;
  return problem('missing-port', message, { blocks: [port[0]] });
}

/** Adds a wire at the end of the order, where both its ports are there and the input is free. */
export function connect(sheet: Sheet, edit: Connect): Result<Sheet> {
  const { from, to, replace = false, name, via } = edit;
  const checked = checkedName(name ?? '');
  if (!checked.ok) return checked;
  if (via?.some(isTooFar)) return fail(tooFar());
  const wire: Wire = {
    from,
    to,
    ...(checked.value === '' ? {} : { name: checked.value }),
    ...(via === undefined || via.length === 0 ? {} : { via }),
  };
  return putWire(sheet, wire, replace);
}

function putWire(sheet: Sheet, wire: Wire, replace: boolean): Result<Sheet> {
  const fault = endFault(sheet, wire.from, 'output') ?? endFault(sheet, wire.to, 'input');
  if (fault !== null) return fail(fault);
  const former = sheet.wires.find(({ to }) => isSamePort(to, wire.to));
  if (former === undefined) return ok({ ...sheet, wires: [...sheet.wires, wire] });
  const { name = former.name, via = former.via } = wire;
  const isThere = isSamePort(former.from, wire.from) && name === former.name;
  if (isThere && JSON.stringify(via) === JSON.stringify(former.via)) return ok(sheet);
  if (replace) return ok({ ...sheet, wires: sheet.wires.map(other => (other === former ? wire : other)) });
  return fail(portTaken(sheet, wire.to));
}

function portTaken(sheet: Sheet, to: PortReference): Problem {
  const block = sheet.blocks.find(({ id }) => id === to[0]);
  const title = block === undefined ? to[0] : blockTitle(block);
  const message = `A wire leads to input ${to[1]} of ${title} already. Remove it first or join another port.`;
  return problem('port-taken', message, { blocks: [to[0]] });
}

/** Removes a wire. */
export function disconnect(sheet: Sheet, { to }: Disconnect): Result<Sheet> {
  const wire = wireTo(sheet, to);
  if (!wire.ok) return wire;
  return ok({ ...sheet, wires: sheet.wires.filter(other => other !== wire.value) });
}

/** Moves a wire's ends and keeps its name and its place in the order. */
export function moveWireEnd(sheet: Sheet, { to, newFrom, newTo, replace = false }: MoveWireEnd): Result<Sheet> {
  const found = wireTo(sheet, to);
  if (!found.ok) return found;
  const wire = found.value;
  if (isSamePort(wire.from, newFrom) && isSamePort(wire.to, newTo)) return ok(sheet);
  const fault = endFault(sheet, newFrom, 'output') ?? endFault(sheet, newTo, 'input');
  if (fault !== null) return fail(fault);
  const inTheWay = sheet.wires.find(other => other !== wire && isSamePort(other.to, newTo));
  if (inTheWay !== undefined && !replace) return fail(portTaken(sheet, newTo));
  const { via: _, ...kept } = wire;
  const wires = sheet.wires.filter(other => other !== inTheWay);
  return ok({
    ...sheet,
    wires: wires.map(other => (other === wire ? { ...kept, from: newFrom, to: newTo } : other)),
  });
}

function replaceWire(sheet: Sheet, before: Wire, after: Wire): Sheet {
  return { ...sheet, wires: sheet.wires.map(wire => (wire === before ? after : wire)) };
}

/** Sets a wire's bend points. */
export function setVia(sheet: Sheet, { to, via }: SetVia): Result<Sheet> {
  const wire = wireTo(sheet, to);
  if (!wire.ok) return wire;
  if (via.some(isTooFar)) return fail(tooFar());
  const { via: former, ...kept } = wire.value;
  if (JSON.stringify(via) === JSON.stringify(former ?? [])) return ok(sheet);
  if (via.length === 0) return ok(replaceWire(sheet, wire.value, kept));
  return ok(replaceWire(sheet, wire.value, { ...kept, via }));
}

/** Names the signal on a wire. */
export function nameWire(sheet: Sheet, { to, name }: NameWire): Result<Sheet> {
  const wire = wireTo(sheet, to);
  if (!wire.ok) return wire;
  const checked = checkedName(name);
  if (!checked.ok) return checked;
  if (checked.value === (wire.value.name ?? '')) return ok(sheet);
  const { name: _, ...kept } = wire.value;
  return ok(replaceWire(sheet, wire.value, checked.value === '' ? kept : { ...kept, name: checked.value }));
}

/** Puts a new block into a wire: its first input takes the wire's source, its first output goes on to where the wire led. */
export function insertOnWire(sheet: Sheet, { to, block }: InsertOnWire): Result<Sheet> {
  const wire = wireTo(sheet, to);
  if (!wire.ok) return wire;
  const { inputs, outputs } = portCounts(block);
  if (inputs === 0 || outputs === 0) {
    const message = `${wireTitle(wire.value)}: ${blockTitle(block)} has no ${inputs === 0 ? 'input' : 'output'}. Place it beside the wire.`;
    return fail(problem('missing-port', message, { blocks: [block.id] }));
  }
  const added = addBlock(sheet, { kind: 'addBlock', block });
  if (!added.ok) return added;
  const { via: _, ...kept } = wire.value;
  const before: Wire = { ...kept, to: [block.id, 0] };
  const after: Wire = { from: [block.id, 0], to: wire.value.to };
  const wires = added.value.wires.flatMap(other => (other === wire.value ? [before, after] : [other]));
  return ok({ ...added.value, wires });
}
