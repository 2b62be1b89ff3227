/** The inks of a sheet in a file: those of the screen in light and dark, and black on white for the printer. */

export type Theme = 'light' | 'dark' | 'print';

export interface Inks {
  readonly paper: string;
  readonly square: string;
  /** What blocks are filled with. */
  readonly field: string;
  readonly ink: string;
  readonly soft: string;
  readonly line: string;
}

export const INKS: Readonly<Record<Theme, Inks>> = {
  light: { paper: '#fcfcf8', square: '#e3e8de', field: '#ffffff', ink: '#1e2b38', soft: '#55626e', line: '#c9cdc9' },
  dark: { paper: '#1b232b', square: '#27313a', field: '#202a33', ink: '#e6e9ea', soft: '#aab4bc', line: '#3b4752' },
  print: { paper: '#ffffff', square: '#dddddd', field: '#ffffff', ink: '#000000', soft: '#333333', line: '#999999' },
};

/** The program's faces where the reader has them, then what every machine has. */
const FACES = {
  math: "'STIX Two Text', 'STIX Two Math', 'Cambria Math', 'Times New Roman', Times, serif",
  figures: "'B612 Mono', ui-monospace, 'Courier New', monospace",
  plain: "'B612', system-ui, Helvetica, Arial, sans-serif",
} as const;

/** The class of a sheet's outermost element, by which its rules hold inside it and nowhere else on a page. */
export function themeClass(theme: Theme): string {
  return `sheet-${theme}`;
}

/** The rules of a sheet's style element. */
export function styleRules(theme: Theme): string {
  const { field, ink, soft, line, square } = INKS[theme];
  const rules: readonly (readonly [selector: string, declarations: string])[] = [
    ['.ink', `fill:none;stroke:${ink};stroke-linejoin:miter`],
    ['.paper', `fill:${field}`],
    ['.thin', 'stroke-width:1'],
    ['.line', 'stroke-width:1.4'],
    ['.state', 'stroke-width:2.6'],
    ['.frame .thin', 'stroke-dasharray:12 3 2 3'],
    ['.solid', `fill:${ink};stroke:none`],
    ['.squares', `fill:none;stroke:${square};stroke-width:1`],
    ['.rule', `fill:none;stroke:${line};stroke-width:1`],
    ['text', `fill:${ink};stroke:none;white-space:pre`],
    ['.soft', `fill:${soft}`],
    ['.strong', 'font-weight:700'],
    ['.math', `font-family:${FACES.math}`],
    ['.figures', `font-family:${FACES.figures}`],
    ['.plain', `font-family:${FACES.plain}`],
  ];
  return rules.map(([selector, declarations]) => `.${themeClass(theme)} ${selector}{${declarations}}`).join('');
}
