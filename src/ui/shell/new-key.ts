/** A key for a drawing that is not kept yet. */

export function newKey(): string {
  return crypto.randomUUID();
}
