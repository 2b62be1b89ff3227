/** The table of export formats: the screen's list, and what the command line's `--as` takes. One file here for each. */

import { writeDiagram } from '../diagram/index.ts';
import { writeC, writePython } from './code/index.ts';
import { writeCsv } from './csv.ts';
import type { Format } from './format.ts';
import { writeLatex } from './latex.ts';
import { writeMathml } from './mathml.ts';
import { writeMatrixMarket } from './matrix-market.ts';
import { writeModelFile } from './model-file.ts';
import { writeNpz } from './npz.ts';
import { writePlainText } from './plain-text.ts';
import { writeReport, writeWorkingsLatex, writeWorkingsText } from './workings/index.ts';

/** In the order in which they are offered. */
export const FORMATS: readonly Format[] = [
  {
    id: 'model',
    label: 'Model file',
    extension: 'model.json',
    mime: 'application/json',
    isBinary: false,
    scope: 'model',
    write: writeModelFile,
  },
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
    id: 'python',
    label: 'Python module (NumPy)',
    extension: 'py',
    mime: 'text/x-python;charset=utf-8',
    isBinary: false,
    scope: 'model',
    write: writePython,
  },
  {
    id: 'c',
    label: 'C source',
    extension: 'c',
    mime: 'text/x-csrc;charset=utf-8',
    isBinary: false,
    scope: 'model',
    write: writeC,
  },
  {
    id: 'latex',
    label: 'LaTeX',
    extension: 'tex',
    mime: 'application/x-tex',
    isBinary: false,
    scope: 'model',
    write: writeLatex,
  },
  {
    id: 'mathml',
    label: 'MathML',
    extension: 'mml',
    mime: 'application/mathml+xml',
    isBinary: false,
    scope: 'model',
    write: writeMathml,
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
  {
    id: 'workings',
    label: 'Workings, plain text',
    extension: 'workings.txt',
    mime: 'text/plain;charset=utf-8',
    isBinary: false,
    scope: 'model',
    write: writeWorkingsText,
  },
  {
    id: 'workings-latex',
    label: 'Workings, LaTeX',
    extension: 'workings.tex',
    mime: 'application/x-tex',
    isBinary: false,
    scope: 'model',
    write: writeWorkingsLatex,
  },
  {
    id: 'report',
    label: 'Report (HTML)',
    extension: 'report.html',
    mime: 'text/html;charset=utf-8',
    isBinary: false,
    scope: 'model',
    write: writeReport,
  },
  {
    id: 'diagram',
    label: 'Diagram file',
    extension: 'poleward.json',
    mime: 'application/json',
    isBinary: false,
    scope: 'drawing',
    write: writeDiagram,
  },
];
