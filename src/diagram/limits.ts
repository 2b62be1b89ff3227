/** The sizes beyond which a drawing is refused, so that no file can fill the memory or the stack. */

/** Bytes of a diagram file and of what a link unpacks to (format.md, Share link: 4 MiB). */
export const MAXIMUM_BYTES = 4 * 1024 * 1024;

/** Blocks of a drawing, those inside groups and the groups themselves included. */
export const MOST_BLOCKS = 20_000;

/** Parameters of a drawing. */
export const MOST_PARAMETERS = 5_000;

/** Requirements of a drawing. */
export const MOST_REQUIREMENTS = 200;

/** Groups inside one another (format.md: at most 32 deep). */
export const DEEPEST_GROUP = 32;

/** Brackets and braces inside one another in a file: a group takes three, what stands around and inside them ten at most. */
export const DEEPEST_JSON = 3 * DEEPEST_GROUP + 32;

/** Inputs of a summing point (format.md). */
export const MOST_SIGNS = 16;

/** Highest order of a dead time's Padé approximant (format.md). */
export const HIGHEST_DELAY_ORDER = 10;

/** Order of a dead time's Padé approximant where the block has none (format.md). */
export const DEFAULT_DELAY_ORDER = 2;

/** Places lie within ± this many sheet units: a thousand screens, and far from where doubles lose the grid. */
export const FARTHEST_PLACE = 1_000_000;

/** Characters of a block's or signal's name. */
export const LONGEST_NAME = 200;

/** Annotations of one sheet. */
export const MOST_ANNOTATIONS = 2_000;

/** Characters of an annotation's text: some three pages. */
export const LONGEST_ANNOTATION = 10_000;

/** An annotation's width and height, sheet units: from one square to what the farthest places are apart. */
export const SMALLEST_ANNOTATION = 20;
export const LARGEST_ANNOTATION = 2 * FARTHEST_PLACE;

/** Problems that one reading reports; after a hundred, more are no help. */
export const MOST_PROBLEMS = 100;
