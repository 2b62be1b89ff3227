/** A JSON value to a requirement: fields by type, then those that the kind's rule asks for. Under reading and edits. */

import * as v from 'valibot';
import { quote } from '../../expression/index.ts';
import {
  REQUIREMENT_KIND_NAMES,
  type Requirement,
  type RequirementKind,
  requirementRule,
} from '../requirements/index.ts';
import { nameSchema, quantitySchema, textSchema } from './block-schemas.ts';
import { whatIsWrong } from './wording.ts';

const BAND = 'two quantities: ["1", "10"]';
const bandEnd = v.union(quantitySchema.options, BAND);

const schema = v.object({
  kind: textSchema,
  input: v.exactOptional(nameSchema),
  output: v.exactOptional(nameSchema),
  cut: v.exactOptional(nameSchema),
  band: v.exactOptional(v.strictTuple([bandEnd, bandEnd], BAND)),
  most: v.exactOptional(quantitySchema),
  least: v.exactOptional(quantitySchema),
  tolerances: v.exactOptional(v.boolean('true or false')),
  note: v.exactOptional(textSchema),
});

/** What a value was read as, or the end of the sentence that says what is wrong with it. */
export type RequirementReading =
  | { readonly requirement: Requirement; readonly fault: null }
  | { readonly requirement: null; readonly fault: string };

const faulty = (fault: string): RequirementReading => ({ requirement: null, fault });

/** Reads one requirement; fields that say nothing are left out. */
export function readRequirement(value: unknown): RequirementReading {
  const parsed = v.safeParse(schema, value);
  if (!parsed.success) return faulty(whatIsWrong(parsed.issues[0]));
  const { kind, note, tolerances, ...fields } = parsed.output;
  if (!isKind(kind)) {
    return faulty(`${quote(kind)} is no kind of requirement. Kinds are ${REQUIREMENT_KIND_NAMES.join(', ')}.`);
  }
  const fault = faultOf(kind, fields);
  if (fault !== null) return faulty(fault);
  return {
    fault: null,
    requirement: {
      kind,
      ...fields,
      ...(tolerances === true ? { tolerances } : {}),
      ...(note === undefined || note === '' ? {} : { note }),
    },
  };
}

const isKind = (kind: string): kind is RequirementKind => REQUIREMENT_KIND_NAMES.some(name => name === kind);

type Fields = Pick<Requirement, 'input' | 'output' | 'cut' | 'band' | 'most' | 'least'>;

/** What is missing or too much for the kind; null where all is there. */
function faultOf(kind: RequirementKind, fields: Fields): string | null {
  const { subject, bounds, hasBand, words } = requirementRule(kind);
  const needed: (keyof Fields)[] = hasBand ? ['band'] : [];
  if (subject === 'channel') needed.push('input', 'output');
  if (subject === 'cut') needed.push('cut');
  const missing = needed.find(field => fields[field] === undefined || fields[field] === '');
  if (missing !== undefined) return `"${missing}" is missing, and ${words} has one.`;
  const given = (['most', 'least'] as const).filter(bound => fields[bound] !== undefined);
  const [bound] = given;
  if (bounds.length === 0) return bound === undefined ? null : `"${bound}" is too much: ${words} has no bound.`;
  const wanted = bounds.map(name => `"${name}"`).join(' or ');
  if (bound === undefined) return `${wanted} is missing, the bound of ${words}.`;
  if (given.length > 1) return `"most" and "least" are both there. Make two requirements of it.`;
  if (!bounds.some(name => name === bound)) return `"${bound}" does not bound ${words}. Write ${wanted}.`;
  const extra = (['input', 'output', 'cut', 'band'] as const).find(
    field => fields[field] !== undefined && !needed.includes(field),
  );
  return extra === undefined ? null : `"${extra}" is too much: ${words} has none.`;
}
