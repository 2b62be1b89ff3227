/** The write-a-block line's grammar: text to a block. */

export type { ReadBlock, WrittenBlock } from './read-written-block.ts';
export { readWrittenBlock } from './read-written-block.ts';
