/** The drawing without its dead times and limiters, for simulations that put them back exactly. */

export { type OpenedDelay, type OpenedLimiter, type OpenedModel, openedModel } from './opened-model.ts';
