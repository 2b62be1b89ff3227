/**
 * The texts beside a block with the areas that they take: signs beside arrowheads, a signal's name over the wire that
 * leaves, a terminal's name and unit, the room for the number under a symbol.
 */

import { nameSpans, type Span } from '../../expression/index.ts';
import type { Block } from '../types.ts';
import { CIRCLE_INPUTS, groupTitle } from './block-box.ts';
import { textWidth } from './character-widths.ts';
import { TYPE } from './content.ts';
import { portNames } from './port-names.ts';
import type { Anchor, Box, Face, Label, PortPlace, Rectangle, TextRole } from './types.ts';

interface Ports {
  readonly inputs: readonly PortPlace[];
  readonly outputs: readonly PortPlace[];
}

interface Setting {
  readonly size: number;
  readonly face: Face;
  readonly role: TextRole;
}

const SETTINGS = {
  name: { size: TYPE.symbol, face: 'math', role: 'name' },
  caption: { size: TYPE.dense, face: 'math', role: 'caption' },
  title: { size: TYPE.small, face: 'plain', role: 'title' },
  port: { size: TYPE.port, face: 'math', role: 'port' },
  sign: { size: TYPE.sign, face: 'math', role: 'sign' },
  unit: { size: TYPE.port, face: 'figures', role: 'unit' },
  value: { size: TYPE.small, face: 'figures', role: 'value' },
} as const satisfies Record<string, Setting>;

/** Room kept for a number that is not known before the drawing is evaluated: seven figures. */
const VALUE_WIDTH = 7 * 0.65 * TYPE.small;

const plainSpan = (text: string): readonly Span[] => [{ text, italic: false, script: 'normal' }];

function label(spans: readonly Span[], setting: Setting, x: number, y: number, anchor: Anchor, least = 0): Label {
  const width = Math.max(least, textWidth(spans, setting.size, setting.face));
  return { text: { kind: 'text', x, y, anchor, spans, ...setting }, area: textArea(x, y, width, setting.size, anchor) };
}

/** The area of a line of text: three quarters of its size above the baseline, a quarter below. */
function textArea(x: number, y: number, width: number, size: number, anchor: Anchor): Rectangle {
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2;
  return { left, right: left + width, top: y - 0.75 * size, bottom: y + 0.25 * size };
}

/** All labels of a block, in the order in which they are drawn. */
export function blockLabels(block: Block, box: Box, ports: Ports): readonly Label[] {
  switch (block.kind) {
    case 'input':
    case 'output':
      return terminalLabels(block.name ?? block.id, block.unit, [...ports.inputs, ...ports.outputs][0], block.kind);
    case 'summer':
      return [...signLabels(block.signs, ports.inputs), ...signalName(block.name, ports)];
    case 'integrator':
      return signalName(block.name ?? block.id, ports);
    case 'gain':
      return [...signalName(block.name, ports), ...valueLabel(/[A-Za-z]/.test(block.gain), box)];
    case 'delay':
      return [...caption(block.name ?? block.id, box), ...valueLabel(/[A-Za-z]/.test(block.time), box)];
    case 'limiter':
      return [...signalName(block.name, ports), ...valueLabel(true, box)];
    case 'differentiator':
      return signalName(block.name, ports);
    case 'transfer-function':
    case 'state-model':
      return caption(block.name ?? block.id, box);
    case 'group':
      return groupLabels(block, box, ports);
    default:
      return block satisfies never;
  }
}

function signalName(name: string | undefined, { outputs }: Ports): readonly Label[] {
  const port = outputs[0];
  if (name === undefined || port === undefined) return [];
  const beside = port.side === 'left' ? port.x - 8 : port.x + 8;
  return [label(nameSpans(name), SETTINGS.name, beside, port.y - 8, port.side === 'left' ? 'end' : 'start')];
}

function caption(name: string, box: Box): readonly Label[] {
  return [label(nameSpans(name), SETTINGS.caption, 0, -box.height / 2 - 6, 'middle')];
}

function valueLabel(isSymbolic: boolean, box: Box): readonly Label[] {
  if (!isSymbolic) return [];
  return [label([], SETTINGS.value, 0, box.height / 2 + 14, 'middle', VALUE_WIDTH)];
}

/**
 * The name stands where no wire leaves: an input's before it, an output's behind it, beside a wire that leaves
 * downwards.
 */
function terminalLabels(name: string, unit: string | undefined, port: PortPlace | undefined, kind: Block['kind']) {
  const upright = port?.side === 'top' || port?.side === 'bottom';
  const onRight = upright || port?.side === 'left';
  const x = onRight ? 9 : -9;
  const anchor: Anchor = onRight ? 'start' : 'end';
  const y = upright && kind === 'input' && port?.side === 'bottom' ? 2 : 5;
  const labels = [label(nameSpans(name), SETTINGS.name, x, y, anchor)];
  if (unit !== undefined && unit !== '') labels.push(label(plainSpan(unit), SETTINGS.unit, x, y + 15, anchor));
  return labels;
}

/** Above the wire that enters from a side, right of the wire that enters from above or below, inside a stadium. */
function signLabels(signs: string, inputs: readonly PortPlace[]): readonly Label[] {
  const inside = inputs.length > CIRCLE_INPUTS;
  return inputs.map((port, index) => {
    const spans = plainSpan(signs[index] === '-' ? '−' : '+');
    const out = port.side === 'left' ? -1 : 1;
    if (port.side === 'top') return label(spans, SETTINGS.sign, port.x + 11, port.y - 4, 'middle');
    if (port.side === 'bottom') return label(spans, SETTINGS.sign, port.x + 11, port.y + 13, 'middle');
    if (inside) return label(spans, SETTINGS.sign, port.x - 8 * out, port.y + 5, 'middle');
    return label(spans, SETTINGS.sign, port.x + 10 * out, port.y - 7, 'middle');
  });
}

function groupLabels(block: Block & { readonly kind: 'group' }, box: Box, ports: Ports): readonly Label[] {
  const names = portNames(block);
  const atPort = (spans: readonly Span[], port: PortPlace | undefined): readonly Label[] =>
    port === undefined
      ? []
      : [label(spans, SETTINGS.port, port.x + (port.x < 0 ? 6 : -6), port.y + 4, port.x < 0 ? 'start' : 'end')];
  return [
    label(groupTitle(block), SETTINGS.title, 0, -box.height / 2 + 14, 'middle'),
    ...names.inputs.flatMap((spans, index) => atPort(spans, ports.inputs[index])),
    ...names.outputs.flatMap((spans, index) => atPort(spans, ports.outputs[index])),
  ];
}
