/** The derivation line by line: the tab Workings. */

export { WorkingsTab } from './WorkingsTab.tsx';
