/** The model as source code in the parameters. */

export { writeC } from './c-source.ts';
export { writePython } from './python-module.ts';
