/**
 * Roots of exact polynomials, certified: starting points, an iteration in doubles, proof and refinement in fixed point, and one
 * rounding at the end. Start reading at certified-roots.ts.
 */

export type { CertifiedRoot } from './certified-roots.ts';
export { certifiedRoots, findCertifiedRoots } from './certified-roots.ts';
