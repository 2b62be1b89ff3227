/** What the drawing requires, judged: asked by the tab and by the verdict line, computed once a derivation. */

import { type Assessment, assess } from '../../analysis/index.ts';
import type { UncheckedDerivation } from '../../compile/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Subject, Topic } from './topic.ts';

export type RequirementsTopic = Topic<null, readonly Assessment[]>;

const known = new WeakMap<UncheckedDerivation, readonly Assessment[]>();

export function answer({ diagram, derivation }: Subject): Result<readonly Assessment[]> {
  const before = known.get(derivation);
  if (before !== undefined) return ok(before);
  const assessed = assess(diagram, derivation.model);
  known.set(derivation, assessed);
  return ok(assessed);
}
