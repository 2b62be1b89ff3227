import { memo } from 'react';
import { type Markup, MarkupView } from '../figures/index.ts';

/** Marks of a drawing inside an `svg`; made anew only when the drawing changes, not while something moves over it. */
export const PlotMarks = memo(function PlotMarks({ marks }: { readonly marks: readonly Markup[] }) {
  return marks.map((mark, index) => (
    // biome-ignore lint/suspicious/noArrayIndexKey: marks are told by their painting order
    <MarkupView key={index} tree={mark} />
  ));
});
