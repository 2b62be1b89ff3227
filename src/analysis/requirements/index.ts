/** What is required of a drawing, measured and judged. */

export { type Assessment, assess } from './assess.ts';
