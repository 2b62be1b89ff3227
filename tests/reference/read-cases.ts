/**
 * The reference cases of tests/reference/cases: diagrams with answers from outside the program. One situation for each case
 * and each of its variants, with the variant's parameters put into the diagram.
 */

import { readdirSync, readFileSync } from 'node:fs';
import { type Diagram, readDiagram } from '../../src/diagram/index.ts';

type Rows = readonly (readonly number[])[];
type ExactRows = readonly (readonly string[])[];
type Matrices<R> = { readonly A: R; readonly B: R; readonly C: R; readonly D: R };

/** A pole or zero. */
export interface ExpectedRoot {
  readonly re: number;
  readonly im: number;
  readonly multiplicity: number;
}

export interface ExpectedTransferFunction {
  readonly input: string;
  readonly output: string;
  readonly numerator: readonly number[];
  readonly denominator: readonly number[];
  readonly numeratorExact?: readonly string[];
  readonly denominatorExact?: readonly string[];
}

export interface ExpectedStep {
  readonly input?: string;
  readonly output?: string;
  readonly t: readonly number[];
  readonly y: readonly number[];
  readonly yExact?: readonly string[];
  readonly simulation?: string;
}

export interface ExpectedError {
  readonly exitStatus: number;
  readonly kind: string;
  readonly words: readonly string[];
  readonly blocks: readonly string[];
  readonly input?: string;
  readonly output?: string;
}

/** What a case asserts; an absent key asserts nothing, null says that the quantity does not exist. */
export interface Expectation extends Partial<Matrices<Rows>> {
  readonly states?: readonly string[];
  readonly inputs?: readonly string[];
  readonly outputs?: readonly string[];
  readonly exact?: Matrices<ExactRows> | null;
  readonly irrationalParameters?: readonly string[];
  readonly symbolic?: Matrices<ExactRows>;
  readonly poles?: readonly ExpectedRoot[];
  readonly zeros?: readonly ExpectedRoot[];
  readonly transferFunctions?: readonly ExpectedTransferFunction[];
  readonly stability?: 'stable' | 'marginal' | 'unstable';
  readonly controllable?: boolean;
  readonly observable?: boolean;
  readonly controllableRank?: number;
  readonly observableRank?: number;
  readonly stateCount?: number;
  readonly initialState?: readonly number[];
  readonly warnings?: readonly { readonly code: string; readonly blocks: readonly string[] }[];
  readonly error?: ExpectedError;
  /** Everything else, in the shapes that the reference README gives. */
  readonly [other: string]: unknown;
}

/** How near a number has to come: absolute + relative · |expected|. */
export interface Tolerance {
  readonly relative: number;
  readonly absolute: number;
}

/** One diagram with one set of answers. */
export interface Situation {
  /** The case's name, and what a variant sets. */
  readonly name: string;
  readonly source: string;
  readonly diagram: Diagram;
  readonly expect: Expectation;
  /** Tolerance of a key of `expect`; of all keys where it has none of its own. */
  tolerance(key?: string): Tolerance;
}

interface CaseFile {
  readonly name: string;
  readonly source: string;
  readonly diagram: { readonly parameters?: readonly { readonly name: string; readonly value: string }[] };
  readonly expect: Expectation;
  readonly variants?: readonly { readonly set: Readonly<Record<string, string>>; readonly expect: Expectation }[];
  readonly tolerance: Tolerance & Readonly<Record<string, Tolerance | number>>;
}

const FOLDER = new URL('./cases/', import.meta.url);

/** Every case and variant, by file name, variants in the order of the file. */
export function readSituations(): readonly Situation[] {
  return readdirSync(FOLDER)
    .filter(file => file.endsWith('.json'))
    .sort()
    .flatMap(file => situationsOf(JSON.parse(readFileSync(new URL(file, FOLDER), 'utf8')) as CaseFile));
}

/** Those that assert at least one of the given keys. */
export function situationsWith(...keys: readonly string[]): readonly Situation[] {
  return readSituations().filter(({ expect }) => keys.some(key => expect[key] !== undefined));
}

function situationsOf(file: CaseFile): Situation[] {
  const { name, source, expect, variants = [] } = file;
  const tolerance = (key?: string): Tolerance => {
    const own = key === undefined ? undefined : file.tolerance[key];
    return typeof own === 'object' ? own : file.tolerance;
  };
  const base: Situation = { name, source, diagram: diagramWith(file, {}), expect, tolerance };
  return [
    base,
    ...variants.map(({ set, expect: expected }) => ({
      ...base,
      name: `${name} with ${Object.entries(set)
        .map(([parameter, value]) => `${parameter} = ${value}`)
        .join(', ')}`,
      diagram: diagramWith(file, set),
      expect: expected,
    })),
  ];
}

/** The case's diagram with some parameters replaced, read as the program reads a file. */
function diagramWith({ name, diagram }: CaseFile, set: Readonly<Record<string, string>>): Diagram {
  const parameters = (diagram.parameters ?? []).map(parameter => ({
    ...parameter,
    value: set[parameter.name] ?? parameter.value,
  }));
  const read = readDiagram(JSON.stringify({ ...diagram, parameters }));
  if (!read.ok) throw new Error(`${name}: ${read.problems.map(({ message }) => message).join(' ')}`);
  return read.value;
}

/** Whether a number comes as near as the tolerance asks. */
export function isWithin(actual: number, expected: number, { relative, absolute }: Tolerance): boolean {
  return Math.abs(actual - expected) <= absolute + relative * Math.abs(expected);
}
