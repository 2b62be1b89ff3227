/** Diagram files in tests, whole or with one thing wrong. */

import { readDiagram } from '../../../../src/diagram/index.ts';
import { problemsOf } from '../../results.ts';

/** A file of the right format and version with these fields. */
export const file = (fields: object): string => JSON.stringify({ format: 'poleward-diagram', version: 1, ...fields });

/** A file with these blocks and wires and nothing else. */
export const sheet = (blocks: readonly unknown[], wires: readonly unknown[] = []): string => file({ blocks, wires });

/** `code: message` of each problem that the text is refused for. */
export const messages = (text: string): string[] => problemsOf(readDiagram(text));
