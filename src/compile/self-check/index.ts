/** Last pass: the model against the drawing's raw equations, by a route of its own. */

export { selfCheck } from './self-check.ts';
