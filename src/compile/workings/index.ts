/** The derivation as lines that somebody can check by hand. */

export { exactWorkings, symbolicWorkings, type Workings } from './workings.ts';
export {
  MOST_SIGNALS,
  type WorkingLine,
  type WorkingSection,
  type WorkingTerm,
} from './workings-over.ts';
