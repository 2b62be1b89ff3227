/** The derivation line by line, in files. */

export { writeReport } from './report.ts';
export { writeWorkingsLatex, writeWorkingsText } from './workings-text.ts';
