/** Saves a plot as an SVG file and says so. */

import { saveFile } from '../dialogs/save-file.ts';
import type { SavedPlot } from '../plots/index.ts';
import { actions } from '../store/index.ts';

export function savePlot({ name, svg }: SavedPlot): void {
  saveFile(name, new Blob([svg], { type: 'image/svg+xml' }));
  actions.notify(`Saved ${name}.`);
}
