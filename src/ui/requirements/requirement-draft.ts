/** A requirement while it is being written: every field as text, and what becomes of it when it is done. */

import {
  boundOf,
  type Diagram,
  displayName,
  type Requirement,
  type RequirementKind,
  requirementRule,
} from '../../diagram/index.ts';

export interface RequirementDraft {
  readonly kind: RequirementKind;
  readonly input: string;
  readonly output: string;
  readonly cut: string;
  readonly low: string;
  readonly high: string;
  readonly side: 'most' | 'least';
  readonly bound: string;
  readonly tolerances: boolean;
  readonly note: string;
}

/** What a requirement may name. */
export interface Nameable {
  readonly inputs: readonly string[];
  readonly outputs: readonly string[];
  readonly cuts: readonly string[];
}

/** The names that the drawing has. */
export function nameable({ blocks, cuts = [] }: Diagram): Nameable {
  const names = (kind: 'input' | 'output') => blocks.filter(block => block.kind === kind).map(displayName);
  return {
    inputs: names('input'),
    outputs: names('output'),
    cuts: cuts.map(({ name }, k) => name ?? `cut ${k + 1}`),
  };
}

/** A draft of a new requirement: the first names that there are, no bound yet. */
export function newDraft({ inputs, outputs, cuts }: Nameable): RequirementDraft {
  return {
    kind: 'overshoot',
    input: inputs[0] ?? '',
    output: outputs[0] ?? '',
    cut: cuts[0] ?? '',
    low: '',
    high: '',
    side: 'most',
    bound: '',
    tolerances: false,
    note: '',
  };
}

/** A draft that says what the requirement says. */
export function draftOf(requirement: Requirement, names: Nameable): RequirementDraft {
  const { kind, input, output, cut, band, note, tolerances } = requirement;
  return {
    ...newDraft(names),
    kind,
    ...(input === undefined ? {} : { input }),
    ...(output === undefined ? {} : { output }),
    ...(cut === undefined ? {} : { cut }),
    low: band?.[0] ?? '',
    high: band?.[1] ?? '',
    side: requirement.most === undefined ? 'least' : 'most',
    bound: boundOf(requirement) ?? '',
    tolerances: tolerances === true,
    note: note ?? '',
  };
}

/** The draft with another kind, bounded on a side that the kind has. */
export function withKind(draft: RequirementDraft, kind: RequirementKind): RequirementDraft {
  const { bounds } = requirementRule(kind);
  const [first] = bounds;
  const side = first === undefined || bounds.includes(draft.side) ? draft.side : first;
  return { ...draft, kind, side };
}

/** The requirement that the draft means; fields that its kind does not have are left out. */
export function requirementOf(draft: RequirementDraft): Requirement {
  const { subject, bounds, hasBand } = requirementRule(draft.kind);
  const bound = draft.bound.trim();
  return {
    kind: draft.kind,
    ...(subject === 'channel' ? { input: draft.input, output: draft.output } : {}),
    ...(subject === 'cut' ? { cut: draft.cut } : {}),
    ...(hasBand ? { band: [draft.low.trim(), draft.high.trim()] as const } : {}),
    ...(bounds.length === 0 ? {} : { [draft.side]: bound }),
    ...(draft.tolerances ? { tolerances: true } : {}),
    ...(draft.note.trim() === '' ? {} : { note: draft.note.trim() }),
  };
}

/** What is not filled in, as a sentence; null where the draft is whole. */
export function missingIn(draft: RequirementDraft): string | null {
  const { subject, bounds, hasBand } = requirementRule(draft.kind);
  if (subject === 'channel' && (draft.input === '' || draft.output === '')) {
    return 'The drawing needs an input and an output first.';
  }
  if (subject === 'cut' && draft.cut === '')
    return 'Put a cut on a wire first: the requirement is about the loop there.';
  if (hasBand && (draft.low.trim() === '' || draft.high.trim() === '')) return 'Give both ends of the band in rad/s.';
  if (bounds.length > 0 && draft.bound.trim() === '') return 'Give the bound.';
  return null;
}
