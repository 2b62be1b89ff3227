/**
 * `poleward check`: the drawing's warnings, then each of its requirements with met or missed and by how much, a line each. Over the
 * whole tolerance of the parameters where a requirement asks for it or `--tolerances` does.
 */

import {
  type Assessment,
  assess,
  judgePoint,
  type TolerancePlan,
  tolerancePlan,
  valuesAt,
  type WorstCase,
  worstCases,
} from '../analysis/index.ts';
import { compile } from '../compile/index.ts';
import { modelWarnings } from '../deliver/index.ts';
import { type Diagram, type Requirement, requirementRule, requirementText } from '../diagram/index.ts';
import { ok, type Result, type Warning } from '../problem/index.ts';
import type { Request } from './request.ts';

type CheckRequest = Extract<Request, { command: 'check' }>;

/** One line of the answer. */
export interface CheckLine {
  readonly code: Warning['code'] | 'requirement-met' | 'requirement-missed' | 'requirement-unchecked';
  readonly message: string;
}

export interface CheckAnswer {
  readonly lines: readonly CheckLine[];
  /** Whether a requirement is missed, or could not be checked. */
  readonly isMissed: boolean;
}

/** The lines for a drawing; its problems where it has no model. */
export function checkDrawing(diagram: Diagram, request: CheckRequest): Result<CheckAnswer> {
  const derivation = compile(diagram);
  if (!derivation.ok) return derivation;
  const lines: CheckLine[] = [...modelWarnings(derivation.value)];
  const { requirements = [] } = diagram;
  const isOver = (requirement: Requirement) => request.tolerances || requirement.tolerances === true;
  let isMissed = false;
  const add = (line: CheckLine) => {
    lines.push(line);
    if (line.code !== 'requirement-met') isMissed = true;
  };
  const drawn = assess(diagram, derivation.value.model);
  const judged = requirements.some(isOver) ? judgedOver(diagram, request) : ok(null);
  if (!judged.ok) return judged;
  requirements.forEach((requirement, k) => {
    const [assessment, worst] = [drawn[k], judged.value?.worst[k]];
    if (assessment === undefined) return;
    const isNominal = assessment.status === 'unchecked' || !isOver(requirement) || !worst || judged.value === null;
    add(isNominal ? nominalLine(assessment) : worstLine(requirement, worst, judged.value.plan));
  });
  return ok({ lines, isMissed });
}

interface Judged {
  readonly plan: TolerancePlan;
  readonly worst: readonly (WorstCase | null)[];
}

function judgedOver(diagram: Diagram, { samples, seed }: CheckRequest): Result<Judged> {
  const plan = tolerancePlan(diagram, { samples, seed });
  if (!plan.ok) return plan;
  const { parameters, points } = plan.value;
  const judged = points.map(point => judgePoint(diagram, parameters, point, null));
  return ok({ plan: plan.value, worst: worstCases(diagram.requirements?.length ?? 0, judged) });
}

function nominalLine(assessment: Assessment): CheckLine {
  const { requirement, status } = assessment;
  return {
    code: `requirement-${status}`,
    message: `${requirementText(requirement)}: ${figureText(requirement, assessment)}`,
  };
}

function worstLine(requirement: Requirement, { assessment, point, missed }: WorstCase, plan: TolerancePlan): CheckLine {
  const { parameters, points, hasEveryCorner } = plan;
  const over = { ...requirement, tolerances: true };
  const place = points[point];
  const values = place === undefined ? [] : valuesAt(parameters, place);
  const at = parameters.map(({ name }, i) => `${name} = ${short(values[i] ?? 0)}`).join(', ');
  const corners = hasEveryCorner ? 'every corner' : '1024 random corners';
  const count = `${points.length} points with ${corners}`;
  const verdict = missed === 0 ? `not refuted by ${count}` : `missed at ${missed} of ${count}`;
  const worst = at === '' ? '' : `; worst ${place?.kind === 'drawn' ? 'as drawn' : `at ${at}`}`;
  return {
    code: missed === 0 ? 'requirement-met' : 'requirement-missed',
    message: `${requirementText(over)}: ${figureText(requirement, assessment)} ${verdict.charAt(0).toUpperCase()}${verdict.slice(1)}${worst}.`,
  };
}

/** `23.39 %, inside by 1.61 %.`, or why there is no figure. */
function figureText(
  { kind }: Requirement,
  { value, slack, reason }: Pick<Assessment, 'value' | 'slack' | 'reason'>,
): string {
  if (value === null || slack === null) return reason;
  const { unit } = requirementRule(kind);
  const withUnit = (figure: number) => `${short(figure)}${unit === '°' ? unit : unit && ` ${unit}`}`;
  return `${withUnit(value)}, ${slack >= 0 ? 'inside' : 'outside'} by ${withUnit(Math.abs(slack))}.`;
}

/** Four significant digits. */
function short(figure: number): string {
  return String(Number(figure.toPrecision(4)));
}
