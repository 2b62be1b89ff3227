/** The standing caution in full, and how far the figures on the page can be relied on. */

import { CAUTION } from '../../deliver/index.ts';
import { Dialog } from './Dialog.tsx';

export function CautionDialog() {
  return (
    <Dialog title="Before you use the model">
      <p>{CAUTION}</p>
      <p>
        Where the page says proved, the figure was decided in exact arithmetic for the values as typed. Every derivation
        is also checked against the drawing's own equations by a second route; its figure stands in the bottom line.
        Neither says that the drawing is the machine.
      </p>
    </Dialog>
  );
}
