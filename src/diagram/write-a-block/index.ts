/** The write-a-block line's grammar: text to a block, or to a wire to a block that is there. */

export { readWiring, type WrittenWiring, wiredBlock, wiringEdits } from './read-wiring.ts';
export type { ReadBlock, WrittenBlock } from './read-written-block.ts';
export { readWrittenBlock } from './read-written-block.ts';
