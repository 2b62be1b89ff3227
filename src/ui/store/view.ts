/** The view slice: what is shown and how, nothing of it part of the document. */

import type { Annotation, Point, PortReference } from '../../diagram/index.ts';
import type { Notation } from '../../worker/index.ts';

export interface ViewSlice {
  readonly notation: Notation;
  /** Whether symbols write derived parameters out. */
  readonly expanded: boolean;
  /** Names of the input and output whose transfer function and step response are shown; null: the first there is. */
  readonly input: string | null;
  readonly output: string | null;
  /** The tab under the system matrix that is open, by its id; null: the first. */
  readonly resultTab: string | null;
  /** Follows the system where null. */
  readonly theme: 'light' | 'dark' | null;
  /** The block whose fields are open on the sheet. */
  readonly editing: string | null;
  /** The text or frame that is being written, with an empty id while it is new. */
  readonly annotating?: Annotation | null;
  /** The block that a wire was begun from by key. */
  readonly wiringFrom: string | null;
  /** Where the block that is being written goes and the port that its wire starts at; null: where it falls. */
  readonly writingAt: { readonly at: Point; readonly from: PortReference | null } | null;
  /** Whether the field that finds blocks is open. */
  readonly finding: boolean;
  /** A title block folded to its heading. */
  readonly folded: boolean;
  readonly dialog: 'export' | 'drawings' | 'keys' | 'caution' | null;
  /** Whether the title block, which is loaded after the drawing, stands on the sheet. */
  readonly hasTitleBlock: boolean;
  /** The last thing that was done or refused, for the eye and the screen reader. */
  readonly notice: Notice | null;
  /** When the drawing was last kept on the device, or why it could not be. */
  readonly kept: { readonly at: string } | { readonly refused: string } | null;
}

export interface Notice {
  readonly text: string;
  readonly tone: 'said' | 'refused';
  /** Two equal texts in a row are still two notices. */
  readonly serial: number;
}

export const FIRST_VIEW: ViewSlice = {
  notation: 'fractions',
  expanded: false,
  input: null,
  output: null,
  resultTab: null,
  theme: null,
  editing: null,
  wiringFrom: null,
  writingAt: null,
  finding: false,
  folded: false,
  dialog: null,
  hasTitleBlock: false,
  notice: null,
  kept: null,
};
