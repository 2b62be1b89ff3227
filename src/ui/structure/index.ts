/** What is reached, shown and superfluous in the model: the tab Structure. */

export { StructureTab } from './StructureTab.tsx';
