/** Input ports that no wire reaches: each reads zero and is worth a warning. */

import type { Warning } from '../../problem/index.ts';
import { type FlatBlock, type FlatDrawing, OPEN } from './flat-drawing.ts';
import { around, titleAtStart } from './titles.ts';

/** One `port-not-connected` for each open input port, in document order, naming the port as the sheet shows it. */
export function openPortWarnings({ blocks, inputStart, source }: FlatDrawing): Warning[] {
  const warnings: Warning[] = [];
  blocks.forEach((flat, b) => {
    const first = inputStart[b] ?? 0;
    const end = inputStart[b + 1] ?? 0;
    for (let port = first; port < end; port++) {
      if (source[port] === OPEN) warnings.push(openPort(flat, port - first, end - first));
    }
  });
  return warnings;
}

function openPort(flat: FlatBlock, port: number, ports: number): Warning {
  const { block, path, name } = flat;
  if (flat.role === 'boundary' && block.kind === 'input') {
    const own = block.name ?? block.id;
    return {
      code: 'port-not-connected',
      blocks: [around(path, block.id)],
      message: `Group ${around(name, own)}: nothing is wired to its input ${own}, which reads zero. ${CONNECT}`,
    };
  }
  const which = ports === 1 ? 'its input' : `its input ${port + 1} of ${ports}`;
  return {
    code: 'port-not-connected',
    blocks: [path],
    message: `${titleAtStart(flat)}: nothing is wired to ${which}, which reads zero. ${CONNECT}`,
  };
}

const CONNECT = 'Connect it unless zero is meant.';
