/** The Greek letters by the names that parameters use for them: `omega` ω, `Omega` Ω. */

const LOWER: readonly (readonly [name: string, letter: string])[] = [
  ['alpha', 'α'],
  ['beta', 'β'],
  ['gamma', 'γ'],
  ['delta', 'δ'],
  ['epsilon', 'ε'],
  ['zeta', 'ζ'],
  ['eta', 'η'],
  ['theta', 'θ'],
  ['iota', 'ι'],
  ['kappa', 'κ'],
  ['lambda', 'λ'],
  ['mu', 'μ'],
  ['nu', 'ν'],
  ['xi', 'ξ'],
  ['omicron', 'ο'],
  ['pi', 'π'],
  ['rho', 'ρ'],
  ['sigma', 'σ'],
  ['tau', 'τ'],
  ['upsilon', 'υ'],
  ['phi', 'φ'],
  ['chi', 'χ'],
  ['psi', 'ψ'],
  ['omega', 'ω'],
];

const capital = (name: string) => `${name.charAt(0).toUpperCase()}${name.slice(1)}`;

/** Letter by name, lower case first. */
export const GREEK_LETTERS: ReadonlyMap<string, string> = new Map([
  ...LOWER,
  ...LOWER.map(([name, letter]) => [capital(name), letter.toUpperCase()] as const),
]);

/** Capitals that look like Latin ones have no command of their own in LaTeX, nor has omicron. */
const WITHOUT_COMMAND: ReadonlyMap<string, string> = new Map([
  ['Alpha', 'A'],
  ['Beta', 'B'],
  ['Epsilon', 'E'],
  ['Zeta', 'Z'],
  ['Eta', 'H'],
  ['Iota', 'I'],
  ['Kappa', 'K'],
  ['Mu', 'M'],
  ['Nu', 'N'],
  ['Omicron', 'O'],
  ['Rho', 'P'],
  ['Tau', 'T'],
  ['Chi', 'X'],
  ['omicron', 'o'],
]);

/** The LaTeX of a Greek letter by its name, null where the name is none. */
export function greekCommand(name: string): string | null {
  if (!GREEK_LETTERS.has(name)) return null;
  const latin = WITHOUT_COMMAND.get(name);
  if (latin !== undefined) return name === 'omicron' ? 'o' : `\\mathrm{${latin}}`;
  return `\\${name}`;
}
