/**
 * The inks and faces of a plot. On the screen they follow the theme; a saved file carries its own, those of the light
 * sheet, so that it looks the same wherever it is opened.
 */

/** Values of SVG paint and font-family attributes. */
export interface Palette {
  readonly paper: string;
  readonly ink: string;
  /** Text beside the curves, and what is less important. */
  readonly soft: string;
  /** Grid, band and frame. */
  readonly line: string;
  readonly curve: string;
  readonly wrong: string;
  /** Margins at a cut. */
  readonly cut: string;
  readonly face: string;
  readonly figures: string;
  readonly math: string;
}

/** The names of src/ui/theme/tokens.css. */
export const SCREEN: Palette = {
  paper: 'var(--field)',
  ink: 'var(--ink)',
  soft: 'var(--ink-soft)',
  line: 'var(--line)',
  curve: 'var(--curve)',
  wrong: 'var(--wrong)',
  cut: 'var(--proof)',
  face: 'var(--face)',
  figures: 'var(--figures)',
  math: 'var(--math)',
};

/** The light sheet's values of the same names. */
export const FILE: Palette = {
  paper: '#ffffff',
  ink: '#1e2b38',
  soft: '#55626e',
  line: '#c9cdc9',
  curve: '#1d5990',
  wrong: '#b02318',
  cut: '#0a7166',
  face: 'B612, system-ui, sans-serif',
  figures: '"B612 Mono", ui-monospace, monospace',
  math: '"STIX Two Text", "Cambria Math", "Times New Roman", serif',
};
