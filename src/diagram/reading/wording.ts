/** A schema's complaint in words: which field, and what it has to be. */

/** The part of a validator's issue that is read here. */
interface Issue {
  readonly message: string;
  readonly received: string;
  readonly path?: readonly { readonly key: unknown }[] | undefined;
}

/** `"gain" is missing.` or `"gain" is not a quantity: text or a finite number.` */
export function whatIsWrong(issue: Issue): string {
  const [first, ...others] = issue.path ?? [];
  if (first === undefined) return 'it is not an object: { ... }.';
  const field = `"${String(first.key)}"`;
  if (others.length === 0 && issue.received === 'undefined') return `${field} is missing.`;
  return `${field} is not ${issue.message}.`;
}
