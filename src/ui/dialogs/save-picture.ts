/** The drawing as a picture: SVG as text, PNG drawn from the same SVG with the page's own maths face in it. */

import mathItalic from '@fontsource/stix-two-text/files/stix-two-text-latin-400-italic.woff2?url';
import mathUpright from '@fontsource/stix-two-text/files/stix-two-text-latin-400-normal.woff2?url';
import { sheetSvg } from '../../deliver/sheet-svg/index.ts';
import { copyText } from '../shell/copy-text.ts';
import { actions, type State, store } from '../store/index.ts';
import { formatValue } from '../title-block/format-value.ts';
import { fileName, saveFile } from './save-file.ts';

/** Points of the picture to one unit of the sheet: 192 dots an inch when printed at the size of the screen. */
const PNG_SCALE = 2;

/** Canvases wider or taller than this fail in some browsers (common practice). */
const LARGEST_SIDE = 8000;

/** What a picture shows: the whole sheet with its title block, or what is selected on it by itself. */
export type PictureScope = 'whole' | 'selected';

export function saveSvg(scope: PictureScope): void {
  const name = fileName(store.getState().document.diagram.title, 'svg');
  saveFile(name, new Blob([picture(scope)], { type: 'image/svg+xml' }));
  actions.notify(`Saved ${name}.`);
}

export async function savePng(scope: PictureScope): Promise<void> {
  const name = fileName(store.getState().document.diagram.title, 'png');
  const png = await pngOf(scope);
  if (png === null) return actions.notify('This browser could not draw the picture. Save it as SVG.', 'refused');
  saveFile(name, png);
  actions.notify(`Saved ${name}.`);
}

export async function copySvg(scope: PictureScope): Promise<void> {
  if (await copyText(picture(scope))) actions.notify('Copied the picture as SVG text.');
  else actions.notify('This browser does not let the page copy. Save the picture instead.', 'refused');
}

/** Whether the browser knows pictures on the clipboard at all. */
export const canCopyPng = (): boolean => typeof ClipboardItem === 'function' && 'clipboard' in navigator;

/** The item is handed over at once, while the click still counts, and holds the promise of its picture. */
export async function copyPng(scope: PictureScope): Promise<void> {
  const png = pngOf(scope).then(made => made ?? Promise.reject(new Error('no picture could be drawn')));
  try {
    await navigator.clipboard.write([new ClipboardItem({ 'image/png': png })]);
    actions.notify('Copied the picture.');
  } catch {
    actions.notify('This browser does not let the page copy pictures. Save the picture instead.', 'refused');
  }
}

/** Whether something is selected that has a picture. */
export function hasPictureSelected({ selection }: Pick<State, 'selection'>): boolean {
  return selection.blocks.size > 0 || (selection.annotations?.size ?? 0) > 0;
}

async function pngOf(scope: PictureScope): Promise<Blob | null> {
  const rules = await faces();
  return drawn(picture(scope).replace(/<svg[^>]*>/, start => start + rules));
}

function picture(scope: PictureScope): string {
  const { document, results, selection } = store.getState();
  const values = new Map(Object.entries(results.values.blocks).map(([id, value]) => [id, formatValue(value)]));
  if (scope === 'whole') return sheetSvg(document.diagram, { theme: 'print', values });
  const { blocks, annotations = new Set<string>() } = selection;
  return sheetSvg(document.diagram, { theme: 'print', values, titleBlock: false, selection: blocks, annotations });
}

/** A style element that carries the maths face: a picture is drawn with no access to the page's files. */
async function faces(): Promise<string> {
  const rules = await Promise.all(
    [
      ['normal', mathUpright],
      ['italic', mathItalic],
    ].map(async ([style, address]) => {
      const file = await fetch(address ?? '');
      return `@font-face{font-family:"STIX Two Text";font-style:${style};src:url(${await dataAddress(await file.blob())})}`;
    }),
  );
  return `<style>${rules.join('')}</style>`;
}

function dataAddress(blob: Blob): Promise<string> {
  return new Promise((resolve, reject) => {
    const reader = new FileReader();
    reader.onload = () => resolve(String(reader.result));
    reader.onerror = () => reject(reader.error);
    reader.readAsDataURL(blob);
  });
}

async function drawn(svg: string): Promise<Blob | null> {
  const image = new Image();
  const address = URL.createObjectURL(new Blob([svg], { type: 'image/svg+xml' }));
  try {
    image.src = address;
    await image.decode();
    const scale = Math.min(PNG_SCALE, LARGEST_SIDE / Math.max(image.width, image.height));
    const canvas = document.createElement('canvas');
    canvas.width = Math.round(image.width * scale);
    canvas.height = Math.round(image.height * scale);
    const context = canvas.getContext('2d');
    if (context === null) return null;
    context.drawImage(image, 0, 0, canvas.width, canvas.height);
    return await new Promise(settle => canvas.toBlob(settle, 'image/png'));
  } catch {
    return null;
  } finally {
    URL.revokeObjectURL(address);
  }
}
