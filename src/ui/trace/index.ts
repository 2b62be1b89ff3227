/** Why an entry is what it is, on the screen: the line under the matrix and the marks on the sheet. Loaded on first pointing. */

export { TraceLine } from './TraceLine.tsx';
export { TraceMarks } from './TraceMarks.tsx';
