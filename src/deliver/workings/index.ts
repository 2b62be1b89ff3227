/** The derivation line by line, in files. */

export { writeReport } from './report.ts';
export { lineMathml, linesMathml } from './workings-mathml.ts';
export { textLine, writeWorkingsLatex, writeWorkingsText } from './workings-text.ts';
export { writtenWorkings } from './written-workings.ts';
