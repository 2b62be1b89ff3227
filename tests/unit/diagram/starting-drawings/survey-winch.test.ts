import { describe, expect, test } from 'vitest';
import {
  addRationals,
  multiplyRationals,
  negateRational,
  type Rational,
  toFraction,
  ZERO,
} from '../../../../src/algebra/index.ts';
import {
  type Block,
  checkExpressions,
  type Diagram,
  portCounts,
  readDiagram,
  startingDrawing,
  writeDiagram,
} from '../../../../src/diagram/index.ts';
import { evaluateParameters, evaluateQuantity } from '../../../../src/expression/index.ts';
import { valueOf } from '../../results.ts';

const WINCH = startingDrawing();

/**
 * What an input port is fed, as coefficients of states and inputs by block id: followed back through the wires by hand, block by
 * block, which a drawing without an algebraic loop allows.
 */
function fedTo(diagram: Diagram, block: Block, port: number): ReadonlyMap<string, Rational> {
  const scope = valueOf(evaluateParameters(diagram.parameters));
  const wire = diagram.wires.find(({ to }) => to[0] === block.id && to[1] === port);
  const source = diagram.blocks.find(({ id }) => id === wire?.from[0]);
  if (source === undefined) throw new Error(`nothing is wired to ${block.id}`);
  const inputs = () => Array.from({ length: portCounts(source).inputs }, (_, i) => fedTo(diagram, source, i));
  switch (source.kind) {
    case 'input':
    case 'integrator':
      return new Map([[source.id, { n: 1n, d: 1n }]]);
    case 'gain': {
      const gain = valueOf(evaluateQuantity(source.gain, scope)).exact ?? ZERO;
      return new Map([...(inputs()[0] ?? [])].map(([id, value]) => [id, multiplyRationals(gain, value)]));
    }
    case 'summer': {
      const sum = new Map<string, Rational>();
      inputs().forEach((input, i) => {
        for (const [id, value] of input) {
          const signed = source.signs[i] === '-' ? negateRational(value) : value;
          sum.set(id, addRationals(sum.get(id) ?? ZERO, signed));
        }
      });
      return sum;
    }
    default:
      throw new Error(`the drawing has no ${source.kind}`);
  }
}

function row(id: string): Record<string, string> {
  const block = WINCH.blocks.find(candidate => candidate.id === id);
  if (block === undefined) throw new Error(`no block ${id}`);
  return Object.fromEntries([...fedTo(WINCH, block, 0)].map(([name, value]) => [name, toFraction(value)]));
}

describe('the survey winch', () => {
  /**
   * By hand, from J ω̇ = T − b ω − R F, Ḟ = k (R ω + v), q̇ = r − F, τ Ṫ = K_p (r − F) + K_i q − T with J = 4/5, b = 16/5,
   * R = 1/4, k = 12, τ = 1/20, K_p = 1/2, K_i = 2/5: −b/J = −4, −R/J = −5/16, 1/J = 5/4, k R = 3, K_p/τ = 10, K_i/τ = 8.
   */
  test('has the equations that its physics gives', () => {
    expect(row('omega')).toEqual({ omega: '-4', F: '-5/16', T: '5/4' });
    expect(row('F')).toEqual({ omega: '3', v: '12' });
    expect(row('q')).toEqual({ r: '1', F: '-1' });
    expect(row('T')).toEqual({ r: '10', F: '-10', q: '8', T: '-20' });
    expect(row('F_out')).toEqual({ F: '1' });
  });

  test('lists its states, inputs and output in the order of the table', () => {
    const ids = (kind: Block['kind']) => WINCH.blocks.filter(block => block.kind === kind).map(({ id }) => id);
    expect(ids('integrator')).toEqual(['omega', 'F', 'q', 'T']);
    expect(ids('input')).toEqual(['r', 'v']);
    expect(ids('output')).toEqual(['F_out']);
  });

  test('is a diagram that can be read, with every expression in order and every port wired', () => {
    expect(valueOf(readDiagram(writeDiagram(WINCH)))).toEqual(WINCH);
    expect(checkExpressions(WINCH)).toEqual([]);
    const ports = WINCH.blocks.reduce((sum, block) => sum + portCounts(block).inputs, 0);
    expect(WINCH.wires).toHaveLength(ports);
  });

  test('stands on the grid of 20 with room between any two blocks', () => {
    const places = WINCH.blocks.map(({ at }) => at ?? [Number.NaN, Number.NaN]);
    for (const [x, y] of places) expect([x % 20, y % 20]).toEqual([0, 0]);
    places.forEach(([x, y], i) => {
      for (const [a, b] of places.slice(i + 1))
        expect(Math.max(Math.abs(x - a), Math.abs(y - b))).toBeGreaterThanOrEqual(60);
    });
  });
});
