/** What a drawing is required to do: the list, its kinds, and how one is said. */

export { boundOf, type Requirement, requirementText } from './requirement.ts';
export {
  REQUIREMENT_KIND_NAMES,
  type RequirementKind,
  type RequirementRule,
  type RequirementSubject,
  requirementRule,
} from './requirement-kinds.ts';
