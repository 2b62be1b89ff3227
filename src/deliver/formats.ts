/** The table of export formats: the screen's list, and what the command line's `--as` takes. One file here for each. */

import { writeCsv } from './csv.ts';
import type { Format } from './format.ts';
import { writeMatrixMarket } from './matrix-market.ts';
import { writeNpz } from './npz.ts';
import { writePlainText } from './plain-text.ts';

/** In the order in which they are offered. */
export const FORMATS: readonly Format[] = [
  {
    id: 'csv',
    label: 'Comma-separated values',
    extension: 'csv',
    mime: 'text/csv;charset=utf-8',
    isBinary: false,
    scope: 'model',
    write: writeCsv,
  },
  {
    id: 'matrix-market',
    label: 'Matrix Market files',
    extension: 'mtx.zip',
    mime: 'application/zip',
    isBinary: true,
    scope: 'model',
    write: writeMatrixMarket,
  },
  {
    id: 'npz',
    label: 'NumPy archive',
    extension: 'npz',
    mime: 'application/zip',
    isBinary: true,
    scope: 'model',
    write: writeNpz,
  },
  {
    id: 'text',
    label: 'Plain text table',
    extension: 'txt',
    mime: 'text/plain;charset=utf-8',
    isBinary: false,
    scope: 'model',
    write: writePlainText,
  },
];
