/**
 * The rooms of src and who may import what: the table behind import-order.test.ts, and the one that the lint rules of
 * .biome.json are compared with. A room imports only rooms of its list, and each only through its index.
 */

const CORE = ['problem', 'numeric', 'algebra', 'expression', 'diagram', 'compile', 'analysis'] as const;
const RESULTS = [...CORE, 'deliver', 'share'] as const;

/** Room → rooms it may import. */
export const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  problem: [],
  numeric: ['problem'],
  algebra: ['problem', 'numeric'],
  expression: CORE.slice(0, 3),
  diagram: CORE.slice(0, 4),
  compile: CORE.slice(0, 5),
  analysis: CORE.slice(0, 6),
  deliver: CORE,
  share: CORE,
  storage: RESULTS,
  worker: RESULTS,
  cli: RESULTS,
  ui: [...RESULTS, 'storage', 'worker'],
};

/** What runs in bare Node as well as in a browser, and touches neither's own interfaces. */
export const PORTABLE_ROOMS: readonly string[] = RESULTS;

/** Library → rooms that may import it; one that is not listed may be imported by none. */
export const LIBRARY_ROOMS: Readonly<Record<string, readonly string[]>> = {
  '@fontsource': ['ui'],
  'd3-scale': ['ui'],
  'd3-shape': ['ui'],
  fflate: ['deliver', 'share'],
  'idb-keyval': ['storage'],
  mathjs: ['expression'],
  node: ['cli'],
  react: ['ui'],
  'react-dom': ['ui'],
  reactflow: ['ui'],
  valibot: ['diagram'],
  /** Made by the build: where the worker's file is. */
  virtual: ['ui'],
  zustand: ['ui'],
};
