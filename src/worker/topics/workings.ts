/** The workings of the drawing on screen: the lines for the page, and the whole to be copied. */

import type { Notation } from '../../deliver/index.ts';
import {
  lineMathml,
  linesMathml,
  textLine,
  writeWorkingsLatex,
  writeWorkingsText,
  writtenWorkings,
} from '../../deliver/workings/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Subject, Topic } from './topic.ts';

export interface WorkingsQuestion {
  readonly notation: Notation;
  /** Whether symbols write derived parameters out. */
  readonly expanded: boolean;
}

export interface WorkingsAnswer {
  readonly sections: readonly WorkingsPart[];
  /** Why there are none or in another notation; empty where there is nothing to say. */
  readonly note: string;
  /** All of it, in the notations that it is copied in. */
  readonly text: string;
  readonly latex: string;
  readonly mathml: string;
}

export interface WorkingsPart {
  readonly title: string;
  readonly remarks: readonly string[];
  /** `mathml` is one element, without the enclosing `math`. */
  readonly lines: readonly { readonly text: string; readonly mathml: string }[];
}

export type WorkingsTopic = Topic<WorkingsQuestion, WorkingsAnswer>;

export function answer(subject: Subject, question: WorkingsQuestion): Result<WorkingsAnswer> {
  const context = { ...subject, ...question };
  const { sections, note } = writtenWorkings(context);
  return ok({
    sections: sections.map(({ title, remarks, lines }) => ({
      title,
      remarks,
      lines: lines.map(line => ({ text: textLine(line), mathml: lineMathml(line) })),
    })),
    note,
    text: writeWorkingsText(context),
    latex: writeWorkingsLatex(context),
    mathml: linesMathml(sections.flatMap(({ lines }) => lines)),
  });
}
