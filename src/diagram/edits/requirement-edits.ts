/** Edits of the list of requirements, and how it follows when what it names is renamed. */

import { fail, ok, problem, type Result } from '../../problem/index.ts';
import { MOST_REQUIREMENTS } from '../limits.ts';
import { keepSame } from '../quantities.ts';
import { readRequirement } from '../reading/index.ts';
import type { Requirement } from '../requirements/index.ts';
import { displayName } from '../titles.ts';
import type { Block, Diagram } from '../types.ts';
import type { AddRequirement, RemoveRequirement, SetRequirement } from './edit.ts';

/** Adds a requirement at the end of the list, or at a place in it. */
export function addRequirement(diagram: Diagram, { requirement, index }: AddRequirement): Result<Diagram> {
  const { requirements = [] } = diagram;
  const read = checked(requirement);
  if (!read.ok) return read;
  if (requirements.length >= MOST_REQUIREMENTS) {
    return fail(problem('too-large', `A drawing has at most ${MOST_REQUIREMENTS} requirements. Remove one first.`));
  }
  const place = Math.max(0, Math.min(index ?? requirements.length, requirements.length));
  return ok({ ...diagram, requirements: requirements.toSpliced(place, 0, read.value) });
}

/** Puts another requirement in the place of one. */
export function setRequirement(diagram: Diagram, { index, requirement }: SetRequirement): Result<Diagram> {
  const { requirements = [] } = diagram;
  const former = requirements[index];
  if (former === undefined) return fail(gone());
  const read = checked(requirement);
  if (!read.ok) return read;
  if (JSON.stringify(former) === JSON.stringify(read.value)) return ok(diagram);
  return ok({ ...diagram, requirements: requirements.with(index, read.value) });
}

/** Takes a requirement out of the list. */
export function removeRequirement(diagram: Diagram, { index }: RemoveRequirement): Result<Diagram> {
  const { requirements = [] } = diagram;
  if (requirements[index] === undefined) return fail(gone());
  return ok(withRequirements(diagram, requirements.toSpliced(index, 1)));
}

function gone() {
  return problem('bad-value', 'There is no such requirement any more. Choose one that is there.');
}

function checked(requirement: Requirement): Result<Requirement> {
  const { requirement: read, fault } = readRequirement(requirement);
  return read === null ? fail(problem('bad-value', `The requirement: ${fault}`)) : ok(read);
}

/** The diagram after an edit of its top sheet: a requirement goes along when the input or output it names is renamed. */
export function withRequirementsOnNames(before: Diagram, after: Diagram): Diagram {
  const { requirements } = after;
  if (requirements === undefined || before.blocks === after.blocks) return after;
  const renamed = { input: newNames('input', before, after), output: newNames('output', before, after) };
  if (renamed.input.size + renamed.output.size === 0) return after;
  return withRequirements(
    after,
    keepSame(requirements, requirement => {
      const input = renamed.input.get(requirement.input ?? '');
      const output = renamed.output.get(requirement.output ?? '');
      if (input === undefined && output === undefined) return requirement;
      return {
        ...requirement,
        ...(input === undefined ? {} : { input }),
        ...(output === undefined ? {} : { output }),
      };
    }),
  );
}

/** The requirements with their bounds and bands changed, as when a parameter is renamed; the same list where none is. */
export function renamedInBounds(
  requirements: readonly Requirement[],
  rename: (text: string) => string,
): readonly Requirement[] {
  return keepSame(requirements, requirement => {
    const { band, most, least } = requirement;
    const changed = {
      ...requirement,
      ...(band === undefined ? {} : { band: [rename(band[0]), rename(band[1])] as const }),
      ...(most === undefined ? {} : { most: rename(most) }),
      ...(least === undefined ? {} : { least: rename(least) }),
    };
    return JSON.stringify(changed) === JSON.stringify(requirement) ? requirement : changed;
  });
}

/** New names by the old ones, of the terminals of a kind that are there before and after. */
function newNames(kind: 'input' | 'output', before: Diagram, after: Diagram): ReadonlyMap<string, string> {
  const terminals = (blocks: readonly Block[]) => blocks.filter(block => block.kind === kind);
  const known = new Map(terminals(before.blocks).map(block => [block.id, displayName(block)]));
  const pairs = terminals(after.blocks).map(block => [known.get(block.id), displayName(block)] as const);
  return new Map(pairs.flatMap(([from, to]) => (from === undefined || from === to ? [] : [[from, to] as const])));
}

/** The same diagram where the list is the same one. */
export function withRequirements(diagram: Diagram, requirements: readonly Requirement[]): Diagram {
  if (requirements === diagram.requirements) return diagram;
  const { requirements: _, ...rest } = diagram;
  return requirements.length === 0 ? rest : { ...rest, requirements };
}
