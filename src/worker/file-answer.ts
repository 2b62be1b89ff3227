/** A file in one of the formats; a drawing without a model has none of the model's. */

import { compile } from '../compile/index.ts';
import { FORMATS, minimalDerivation } from '../deliver/index.ts';
import { fail, ok, problem } from '../problem/index.ts';
import type { FileAnswer, Question } from './protocol.ts';

export function fileAnswer({
  id,
  diagram,
  format,
  notation,
  minimal,
}: Extract<Question, { kind: 'file' }>): FileAnswer {
  const found = FORMATS.find(candidate => candidate.id === format);
  if (found === undefined) {
    return { kind: 'file', id, outcome: fail(problem('bad-option', `There is no format ${format}.`)) };
  }
  if (found.scope === 'drawing') return { kind: 'file', id, outcome: ok(found.write(diagram)) };
  const derived = compile(diagram);
  if (!derived.ok) return { kind: 'file', id, outcome: derived };
  const whole = { diagram, derivation: derived.value };
  const wanted = minimal ? minimalDerivation(whole) : ok(whole);
  const outcome = wanted.ok ? ok(found.write({ ...wanted.value, notation })) : wanted;
  return { kind: 'file', id, outcome };
}
