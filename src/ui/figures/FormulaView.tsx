/** A formula that the worker has written as one MathML element. */

import { createElement } from 'react';

interface FormulaViewProps {
  /** Made by our own writer, which escapes every name: no text of the user is markup in it. */
  readonly mathml: string;
  /** The same on one line, for the pointer's hint. */
  readonly text: string;
  readonly isBlock?: boolean;
}

export function FormulaView({ mathml, text, isBlock = false }: FormulaViewProps) {
  const content = { display: isBlock ? 'block' : 'inline', dangerouslySetInnerHTML: { __html: mathml } };
  return (
    <span className="formula-view" title={text}>
      {createElement('math', content)}
    </span>
  );
}
