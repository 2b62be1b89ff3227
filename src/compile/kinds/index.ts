/** The law of every kind of block as a small state-space model. */

export type { ContributedState, Contribution } from './contribution.ts';
export { contributionOf } from './laws.ts';
export { type BlockReadings, readContributions } from './read-contributions.ts';
