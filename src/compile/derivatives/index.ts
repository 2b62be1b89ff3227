/** Fifth pass: drawings that differentiate, reduced to states and inputs. */

export { type ReducedModel, reduceDerivatives } from './reduce-derivatives.ts';
