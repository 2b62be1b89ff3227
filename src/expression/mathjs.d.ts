/** mathjs exports the makers of its functions but leaves them out of its types. */

import type { ParsedNode } from './parse-tree.ts';

declare module 'mathjs/number' {
  export function createParse(dependencies: Readonly<Record<string, unknown>>): (text: string) => ParsedNode;
}
