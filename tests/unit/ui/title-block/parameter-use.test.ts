import { expect, test } from 'vitest';
import { type Diagram, emptyDiagram } from '../../../../src/diagram/index.ts';
import { parameterUse } from '../../../../src/ui/title-block/parameter-use.ts';
import { shownParameters } from '../../../../src/ui/title-block/shown-parameters.ts';

const DIAGRAM: Diagram = {
  ...emptyDiagram(),
  parameters: [
    { name: 'K', value: '2*a' },
    { name: 'a', value: '1', tolerance: 'da' },
    { name: 'idle', value: 'idle' },
    { name: 'T', value: '3' },
  ],
  blocks: [
    { id: 'g', kind: 'gain', gain: 'K/missing' },
    {
      id: 'inside',
      kind: 'group',
      sheet: {
        blocks: [{ id: 'f', kind: 'transfer-function', numerator: 'pi', denominator: 'T*s + late' }],
        wires: [],
      },
    },
    { id: 'broken', kind: 'gain', gain: '2 lost' },
  ],
};

test('parameters used by blocks, in groups and by other parameters are used, by themselves they are not', () => {
  expect([...parameterUse(DIAGRAM).unused]).toEqual(['idle']);
});

test('names that are used and not defined are missing, constants and s are not', () => {
  expect(parameterUse(DIAGRAM).missing).toEqual(['da', 'missing', 'late']);
});

test('the table shows the declared order, or names with small and capital letters side by side', () => {
  expect(shownParameters(DIAGRAM.parameters, 'declared', '')).toEqual(['K', 'a', 'idle', 'T']);
  expect(shownParameters(DIAGRAM.parameters, 'name', '')).toEqual(['a', 'idle', 'K', 'T']);
});

test('a filter finds name, unit and note without regard to capitals', () => {
  const parameters = [
    { name: 'J', value: '1', unit: 'kg*m^2' },
    { name: 'b', value: '1', note: 'Bearing' },
  ];
  expect(shownParameters(parameters, 'declared', 'KG')).toEqual(['J']);
  expect(shownParameters(parameters, 'declared', 'bear')).toEqual(['b']);
  expect(shownParameters(parameters, 'declared', 'x')).toEqual([]);
});
