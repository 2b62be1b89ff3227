/** What `--help` prints. */

import { CAUTION, FORMATS } from '../deliver/index.ts';

/** The text, ended by a line break. */
export function usage(): string {
  const width = Math.max(...FORMATS.map(({ id }) => id.length)) + 2;
  const formats = FORMATS.map(({ id, label }) => `    ${id.padEnd(width)}${label}`);
  return `${HEAD}\n${formats.join('\n')}\n\n${TAIL}\n\n${CAUTION}\n`;
}

const HEAD = `Usage:
  poleward derive FILE|LINK|-   [--as FORMAT] [--out PATH] [--notation NOTATION] [--expand] [--minimal]
                                [--set NAME=EXPR]...
  poleward check  FILE|LINK|-   [--tolerances] [--samples N] [--seed N]
  poleward link   FILE|-

derive prints the model of a drawing: A, B, C, D with names, poles, zeros, transfer functions.
check  prints the drawing's warnings and errors, then what it requires, met or missed and by how much, one a line.
link   prints the fragment of a share link; the page's address goes before it.

FILE is a drawing (*.poleward.json), LINK a share link or its #d1=... part, - standard input.

  --as FORMAT              one of the following, model where none is given:`;

const TAIL = `  --out PATH               writes a file instead of standard output
  --notation NOTATION      matrix entries of text, LaTeX and MathML: symbols (of the parameters), fractions (where none is
                           given) or decimals
  --expand                 writes derived parameters out in symbols, wn as sqrt(k/m), where else they keep their names
  --minimal                reduces the model to the fewest states with the same transfer functions
  --set NAME=EXPR          gives a parameter another value; may be repeated
  --tolerances             check judges every requirement over the whole tolerance of the parameters: every corner, and points
                           drawn at random
  --samples N, --seed N    how many points are drawn, 200 where none is given, and from which seed, 1 where none is given
  --help, --version

Exit status: 0 done; 2 the input cannot be used; 3 the drawing has no state-space model;
4 a requirement is missed or could not be checked.`;
