/** What the loop has to do, on the page: the tab with the list, and the count in the verdict line. */

export { RequirementsTab } from './RequirementsTab.tsx';
export { RequirementVerdict } from './RequirementVerdict.tsx';
