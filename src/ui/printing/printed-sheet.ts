/**
 * What the browser prints, by its own key or by the page's command: the drawing as an engineering drawing on one page in place
 * of the page's own look. It is made when printing begins and gone when it ends.
 */

import './printing.css';
import { paperSvg } from '../../deliver/sheet-svg/index.ts';
import { store } from '../store/index.ts';
import { formatValue } from '../title-block/format-value.ts';

/** Rules for the page's direction and the drawing's inks; the page's own policy lets no style element in. */
const rules = new CSSStyleSheet();

/** Puts the sheet there for the printer. */
function makeSheet(): void {
  if (document.querySelector('.printed-sheet') !== null) return;
  const { document: slice, results } = store.getState();
  const values = Object.entries(results.values.blocks).map(([id, value]) => [id, formatValue(value)] as const);
  const paper = paperSvg(slice.diagram, new Map(values));
  const bare = paper.svg.replace(/<style>[^<]*<\/style>/, '');
  const svg = new DOMParser().parseFromString(bare, 'image/svg+xml').documentElement;
  rules.replaceSync(`@page { size: ${paper.orientation}; margin: 0; } ${paper.rules}`);
  if (!document.adoptedStyleSheets.includes(rules)) document.adoptedStyleSheets.push(rules);
  const sheet = document.createElement('div');
  sheet.className = 'printed-sheet';
  sheet.append(document.importNode(svg, true));
  document.body.append(sheet);
}

function removeSheet(): void {
  document.querySelector('.printed-sheet')?.remove();
  document.adoptedStyleSheets = document.adoptedStyleSheets.filter(sheet => sheet !== rules);
}

/** Has the sheet ready whenever printing begins. Returns what ends that. */
export function followPrinting(): () => void {
  const print = window.matchMedia('print');
  const onChange = () => (print.matches ? makeSheet() : removeSheet());
  window.addEventListener('beforeprint', makeSheet);
  window.addEventListener('afterprint', removeSheet);
  print.addEventListener('change', onChange);
  return () => {
    window.removeEventListener('beforeprint', makeSheet);
    window.removeEventListener('afterprint', removeSheet);
    print.removeEventListener('change', onChange);
    removeSheet();
  };
}
