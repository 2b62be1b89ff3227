/** Last pass: the model against the drawing's raw equations, by a route of its own. */

export { type DirectResponse, directResponse } from './direct-response.ts';
export { selfCheck } from './self-check.ts';
