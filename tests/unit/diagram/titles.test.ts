import { describe, expect, test } from 'vitest';
import { type Block, blockTitle, blockTitleAtStart, displayName } from '../../../src/diagram/index.ts';

describe('a block is called', () => {
  test.each<readonly [Block, string]>([
    [{ id: 'K_p', kind: 'gain', gain: '2' }, 'gain K_p'],
    [{ id: 'k1', kind: 'gain', gain: '2', name: 'K_p' }, 'gain K_p'],
    [{ id: 'e', kind: 'summer', signs: '+-' }, 'summing point e'],
    [{ id: 'q', kind: 'integrator' }, 'integrator q'],
    [{ id: 'G', kind: 'transfer-function', numerator: '1', denominator: 's' }, 'transfer function G'],
    [{ id: 'M', kind: 'state-model', A: [], B: [], C: [], D: [] }, 'state model M'],
    [{ id: 'd', kind: 'delay', time: '1' }, 'dead time d'],
    [{ id: 'D', kind: 'differentiator' }, 'differentiator D'],
    [{ id: 'l', kind: 'limiter', lower: '0', upper: '1' }, 'limiter l'],
    [{ id: 'S', kind: 'group', sheet: { blocks: [], wires: [] } }, 'group S'],
    [{ id: 'r', kind: 'input' }, 'input r'],
    [{ id: 'y', kind: 'output' }, 'output y'],
  ])('%o', (block, title) => {
    expect(blockTitle(block)).toBe(title);
  });

  test('by its name alone where that says the kind', () => {
    expect(blockTitle({ id: 'gain2', kind: 'gain', gain: '1' })).toBe('gain2');
    expect(blockTitle({ id: 'limiter', kind: 'limiter', lower: '0', upper: '1' })).toBe('limiter');
    expect(blockTitle({ id: 'gains', kind: 'gain', gain: '1' })).toBe('gain gains');
  });

  test('by what is in it where it has neither name nor id yet', () => {
    expect(blockTitle({ id: '', kind: 'gain', gain: '3.5' })).toBe('gain 3.5');
    expect(blockTitle({ id: '', kind: 'summer', signs: '+-' })).toBe('summing point +-');
    expect(blockTitle({ id: '', kind: 'delay', time: 'T' })).toBe('dead time T');
    expect(blockTitle({ id: '', kind: 'transfer-function', numerator: 's+2', denominator: 's+5' })).toBe(
      'transfer function (s+2)/(s+5)',
    );
    expect(blockTitle({ id: '', kind: 'integrator' })).toBe('integrator');
  });

  test('with a capital at the beginning of a sentence', () => {
    expect(blockTitleAtStart({ id: 'K_p', kind: 'gain', gain: '2' })).toBe('Gain K_p');
  });

  test('by its id where no name is shown', () => {
    expect(displayName({ id: 'x', kind: 'integrator' })).toBe('x');
    expect(displayName({ id: 'x', kind: 'integrator', name: 'omega' })).toBe('omega');
  });
});
