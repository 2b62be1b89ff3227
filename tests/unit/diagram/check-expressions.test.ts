import { describe, expect, test } from 'vitest';
import {
  type Block,
  checkExpressions,
  type Diagram,
  emptyDiagram,
  startingDrawing,
} from '../../../src/diagram/index.ts';

const drawing = (blocks: readonly Block[], parameters: Diagram['parameters'] = []): Diagram => ({
  ...emptyDiagram(),
  parameters,
  blocks,
});
const messages = (diagram: Diagram) => checkExpressions(diagram).map(({ code, message }) => `${code}: ${message}`);

describe('the expressions of a drawing', () => {
  test('are all right where all have values', () => {
    expect(checkExpressions(startingDrawing())).toEqual([]);
    expect(checkExpressions(emptyDiagram())).toEqual([]);
  });

  test('are reported by block, and by field where there are several', () => {
    const blocks: readonly Block[] = [
      { id: 'Kp', kind: 'gain', gain: '2 k' },
      { id: 'x', kind: 'integrator', initial: 'm' },
      { id: 'G', kind: 'transfer-function', numerator: 's^-1', denominator: '1/0' },
      { id: 'd', kind: 'delay', time: '' },
      { id: 'l', kind: 'limiter', lower: '1e999', upper: '1e400' },
      { id: 'M', kind: 'state-model', A: [['s']], B: [['1']], C: [['1']], D: [['0']], initial: ['sqrt(-1)'] },
    ];
    expect(messages(drawing(blocks, [{ name: 'k', value: '1' }]))).toEqual([
      'bad-expression: Gain Kp: "2 k" is not an expression. Write 2*k.',
      'unknown-parameter: Integrator x: m is not a parameter. Add m to the parameters.',
      'bad-expression: Transfer function G, numerator: "s^-1" is not a polynomial in s. s has a negative power there.',
      'division-by-zero: Transfer function G, denominator: "1/0" divides by zero. Change a value in it.',
      'bad-expression: Dead time d: Nothing is written here. Write a number or a formula.',
      'bad-expression: Limiter l, lower: 1e999 is beyond what is kept exactly: exponents go from -400 to 400.',
      'bad-expression: Limiter l, upper: "1e400" is too large: it fits no finite double. Choose other units.',
      'bad-expression: State model M, A: "s" contains the Laplace variable s. Use a transfer function block for what depends on s.',
      'bad-expression: State model M, initial: "sqrt(-1)" has no real value. Change a value in it.',
    ]);
  });

  test('in groups bear the groups’ names and the path', () => {
    const inner: Block = { id: 'K', kind: 'gain', gain: '' };
    const group: Block = { id: 'S', kind: 'group', name: 'drive', sheet: { blocks: [inner], wires: [] } };
    const [problem] = checkExpressions(drawing([group]));
    expect(problem?.message).toBe('Gain drive.K: Nothing is written here. Write a number or a formula.');
    expect(problem?.blocks).toEqual(['S.K']);
  });

  test('of the parameters come first and alone, since the blocks depend on them', () => {
    const blocks: readonly Block[] = [{ id: 'K', kind: 'gain', gain: '2 k' }];
    expect(messages(drawing(blocks, [{ name: 'k', value: 'k' }]))).toEqual([
      'cyclic-parameters: Parameter k: its value uses k itself. Give it a value of its own.',
    ]);
  });

  test('of tolerances are among them', () => {
    const parameters = [
      { name: 'k', value: '1', tolerance: '10 %' },
      { name: 'm', value: '1', tolerance: '-k' },
      { name: 'n', value: '1', tolerance: '10 percent' },
    ];
    expect(messages(drawing([], parameters))).toEqual([
      'bad-expression: Parameter m, tolerance: "-k" is a negative tolerance. Leave out its sign.',
      'bad-expression: Parameter n, tolerance: "10 percent" is not an expression. Write 10*percent.',
    ]);
  });

  test('are reported up to a hundred', () => {
    const blocks = Array.from({ length: 300 }, (_, i): Block => ({ id: `g${i}`, kind: 'gain', gain: '' }));
    expect(checkExpressions(drawing(blocks))).toHaveLength(100);
  });
});
