/** The sheet as a standalone SVG file. */

export { escaped } from './markup.ts';
export { paperSvg } from './paper-svg.ts';
export { type SheetSvgOptions, sheetSvg } from './sheet-svg.ts';
export type { Theme } from './themes.ts';
