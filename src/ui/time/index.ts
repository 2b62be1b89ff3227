/** The response over time: any input signal, dead times and limiters as they are, comparison, closed form. */

export { TimeTab } from './TimeTab.tsx';
