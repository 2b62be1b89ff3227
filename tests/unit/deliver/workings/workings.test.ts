/** Workings of a loop around a dead time, each line worked out by hand, and the report that holds them. */

import { describe, expect, test } from 'vitest';
import { compile, type Derivation } from '../../../../src/compile/index.ts';
import { CAUTION, type Notation } from '../../../../src/deliver/index.ts';
import type { Block, Diagram } from '../../../../src/diagram/index.ts';
import { readXml } from '../read-xml.ts';
import { textIn } from '../written.ts';

/** The loop r − b → K_1 → K_2 → b; its first gain drives an integrator through a dead time of first order. */
const LOOP: Diagram = {
  format: 'poleward-diagram',
  version: 1,
  title: 'Two <gains> & a delay',
  parameters: [
    { name: 'K_1', value: '2' },
    { name: 'K_2', value: '1/2' },
    { name: 'T', value: '0.1', unit: 's' },
  ],
  blocks: [
    { id: 'r', kind: 'input' },
    { id: 'diff', kind: 'summer', signs: '+-' },
    { id: 'a', kind: 'gain', gain: 'K_1' },
    { id: 'b', kind: 'gain', gain: 'K_2' },
    { id: 'lag', kind: 'delay', time: 'T', order: 1 },
    { id: 'x', kind: 'integrator' },
    { id: 'y', kind: 'output' },
  ],
  wires: [
    { from: ['r', 0], to: ['diff', 0] },
    { from: ['diff', 0], to: ['a', 0] },
    { from: ['a', 0], to: ['b', 0] },
    { from: ['b', 0], to: ['diff', 1] },
    { from: ['a', 0], to: ['lag', 0] },
    { from: ['lag', 0], to: ['x', 0] },
    { from: ['x', 0], to: ['y', 0] },
  ],
};

function derivationOf(diagram: Diagram): Derivation {
  const derived = compile(diagram);
  if (!derived.ok) throw new Error('no model');
  return derived.value;
}

const write = (id: string, notation: Notation, diagram: Diagram = LOOP) =>
  textIn(id, derivationOf(diagram), notation, diagram);

/** A chain of gains from the input to the output. */
function chain(gains: number): Diagram {
  const ids = Array.from({ length: gains }, (_, k) => `g${k}`);
  const path = ['u', ...ids, 'y'];
  return {
    ...LOOP,
    blocks: [
      { id: 'u', kind: 'input' },
      ...ids.map((id): Block => ({ id, kind: 'gain', gain: '2' })),
      { id: 'y', kind: 'output' },
    ],
    wires: path.slice(1).map((id, k) => ({ from: [path[k] ?? 'u', 0], to: [id, 0] }) as const),
  };
}

describe('workings', () => {
  // By hand: e = r − K2 K1 e, so e = r/(1 + K1 K2); (1 − sT/2)/(1 + sT/2) = −1 + (4/T)/(s + 2/T).
  test('go from the drawing over the loop and substitutions to the result, in symbols', () => {
    const [, ...lines] = write('workings', 'symbols').split('\n').slice(0, -5);
    expect(lines.filter(line => line !== '' && !line.startsWith('--'))).toEqual([
      'As read off the drawing',
      'Dead time lag of T s stands in by its Padé approximant of order 1, with the state lag_1.',
      'd/dt lag_1 = -2/T*lag_1 + a',
      'd/dt x = lag',
      'y = x',
      'diff = r - b',
      'a = K_1*diff',
      'b = K_2*a',
      'lag = 4/T*lag_1 - a',
      'Algebraic loop of diff, a, b',
      'diff = r - b',
      'a = K_1*diff',
      'b = K_2*a',
      'Its solution',
      'diff = 1/(1 + K_1*K_2)*r',
      'a = K_1/(1 + K_1*K_2)*r',
      'b = K_1*K_2/(1 + K_1*K_2)*r',
      'Other signals by substitution',
      'lag = 4/T*lag_1 - K_1/(1 + K_1*K_2)*r',
      'Result',
      'd/dt lag_1 = -2/T*lag_1 + K_1/(1 + K_1*K_2)*r',
      'd/dt x = 4/T*lag_1 - K_1/(1 + K_1*K_2)*r',
      'y = x',
    ]);
  });

  test('hold fractions or decimals where those are asked for', () => {
    expect(write('workings', 'fractions')).toContain('b = 1/2*r\n');
    expect(write('workings', 'decimals')).toContain('b = 0.5*r\n');
  });

  test('in LaTeX are arrays with a sign of equality in the middle column', () => {
    const text = write('workings-latex', 'symbols');
    expect(text).toContain('  a & = & \\frac{K_{1}}{1 + K_{1} \\, K_{2}} \\, r \\\\\n');
    expect(text.match(/begin\{array\}/g)).toHaveLength(5);
    expect(text.match(/end\{array\}/g)).toHaveLength(5);
  });

  test('name the rate of a differentiated signal and the state that an input was taken from', () => {
    const diagram: Diagram = {
      ...LOOP,
      blocks: [
        { id: 'u', kind: 'input' },
        { id: 'du', kind: 'differentiator' },
        { id: 'x', kind: 'integrator' },
        { id: 'y', kind: 'output' },
      ],
      wires: [
        { from: ['u', 0], to: ['du', 0] },
        { from: ['du', 0], to: ['x', 0] },
        { from: ['x', 0], to: ['y', 0] },
      ],
    };
    const text = write('workings', 'symbols', diagram);
    expect(text).toContain('is the time derivative of');
    expect(text).toContain('An input was taken from x: z = x - b*u.');
    expect(text).toContain('d/dt x = 0\ny = x + u\n');
  });

  test('stop at two hundred signals and say so', () => {
    const said = 'Workings are written for drawings of up to 200 signals that are derived exactly.';
    expect(write('workings', 'fractions', chain(199))).not.toContain(said);
    expect(write('workings', 'fractions', chain(200))).toContain(said);
  });
});

describe('the report', () => {
  const html = write('report', 'symbols');

  test('has its parts in order and ends with the caution', () => {
    expect([...html.matchAll(/<h2>([^<]*)<\/h2>/g)].map(([, title]) => title)).toEqual([
      'Drawing',
      'Parameters',
      'Workings',
      'Matrices',
      'Poles',
      'Self-check',
      'Warnings',
    ]);
    expect(html).toContain(`<p class="caution">${CAUTION}</p>\n</body></html>`);
  });

  test('writes a title with marked characters as text', () => {
    expect(html).toContain('<h1>Two &lt;gains&gt; &amp; a delay</h1>');
    expect(html).not.toContain('<gains>');
  });

  test('needs no other file and runs nothing', () => {
    expect(html).not.toMatch(/<script|<link|<img|\ssrc=|\shref=|@import|url\(/);
  });

  test('holds the drawing, and workings in well-formed MathML', () => {
    expect(html).toContain('<svg xmlns="http://www.w3.org/2000/svg"');
    const places = [...html.matchAll(/<g transform="(translate\([^"]*\))"><(?:rect|circle|path)/g)].map(([, at]) => at);
    expect(new Set(places).size).toBe(LOOP.blocks.length);
    const equations = [...html.matchAll(/<math[\s\S]*?<\/math>/g)].map(([math]) =>
      readXml(math.replaceAll('&#x2062;', '').replaceAll('&#x2212;', '-')),
    );
    expect(equations.length).toBeGreaterThan(6);
  });

  test('lists the poles of the loop: the integrator and the approximant', () => {
    expect(html).toContain('<tr><td>-20</td><td>0</td><td>1</td></tr>');
    expect(html).toContain('<tr><td>0</td><td>0</td><td>1</td></tr>');
  });
});
