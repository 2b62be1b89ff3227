/** Fourth pass: what states and outputs are fed, in states and inputs alone. */

export { type Elimination, eliminate, type SolvedLoop } from './eliminate.ts';
export { type KeptElimination, mayStartFrom } from './kept-elimination.ts';
