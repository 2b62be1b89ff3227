/**
 * Expressions and names as lines of typeset mathematics: products without a sign, powers raised, Greek letters by name, what
 * follows an underscore lowered. Nothing is evaluated or checked: what is no expression yet is shown as it was typed.
 */

import type { Span } from './types.ts';

const GREEK: ReadonlyMap<string, string> = new Map(
  (
    'alpha α beta β gamma γ delta δ epsilon ε zeta ζ eta η theta θ iota ι kappa κ lambda λ mu μ nu ν xi ξ pi π rho ρ ' +
    'sigma σ tau τ phi φ chi χ psi ψ omega ω Gamma Γ Delta Δ Theta Θ Lambda Λ Xi Ξ Pi Π Sigma Σ Phi Φ Psi Ψ Omega Ω'
  )
    .split(' ')
    .reduce<[string, string][]>((pairs, word, index, words) => {
      if (index % 2 === 0) pairs.push([word, words[index + 1] ?? '']);
      return pairs;
    }, []),
);

/** A name as it is written by hand: `K_p` with its p lowered, `omega` as ω, `x2` with its 2 lowered. */
export function nameSpans(name: string): Span[] {
  const parts = /^([A-Za-z]+)_?(\w*)$/.exec(name);
  const stem = parts?.[1] ?? name;
  const rest = (parts?.[2] ?? '').replaceAll('_', ' ');
  const letter = GREEK.get(stem) ?? stem;
  const spans: Span[] = [{ text: letter, italic: true, script: 'normal' }];
  if (rest !== '') spans.push({ text: GREEK.get(rest) ?? rest, italic: !/^\d/.test(rest), script: 'sub' });
  return spans;
}

const upright = (text: string, script: Span['script'] = 'normal'): Span => ({ text, italic: false, script });

/** An expression on one line. */
export function inlineSpans(expression: string): Span[] {
  const tokens = expression.match(/[A-Za-z]\w*|\d[\d.]*(?:[eE][-+]?\d+)?|\s+|./gu) ?? [];
  const spans: Span[] = [];
  let raised = false;
  let depth = 0;
  for (const token of tokens) {
    if (raised && depth === 0 && !/^[\w(-]/.test(token)) raised = false;
    if (token === '^') {
      raised = true;
      continue;
    }
    if (raised && token === '(') depth += 1;
    const script = raised ? 'sup' : 'normal';
    if (/^[A-Za-z]/.test(token)) {
      const name = nameSpans(token);
      spans.push(...(raised ? name.map(span => ({ ...span, script: 'sup' as const })) : name));
    } else if (token === '*') spans.push(upright('\u2009', script));
    else if (token === '-') spans.push(upright('−', script));
    else if (/^\s+$/.test(token)) spans.push(upright('\u2009', script));
    else spans.push(upright(token, script));
    if (raised && token === ')') depth -= 1;
    if (raised && depth === 0 && token !== '-' && token !== '(') raised = false;
  }
  return spans;
}
