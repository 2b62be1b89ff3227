/**
 * Advance widths of the faces in which a sheet is set, so that a block's size is the same in the browser, in a file and
 * in a test, before any font has loaded. Read from the horizontal metrics of the fonts themselves (STIX Two Text
 * regular and italic, B612), in thousandths of the type size, characters within 2.5 % of each other in one row; a
 * character that is not listed takes the face's usual width.
 */

import type { Span } from '../../expression/index.ts';
import type { Face } from './types.ts';

/** Width, then the characters that have it. */
type WidthTable = readonly (readonly [width: number, characters: string])[];

const UPRIGHT: WidthTable = [
  [167, '\u2009'],
  [187, "'"],
  [235, '  '],
  [245, ',.:;'],
  [261, 'ιj'],
  [267, '|'],
  [284, '·!li'],
  [296, '′'],
  [310, 'f{}'],
  [315, '-t'],
  [334, '"'],
  [345, '()[]'],
  [357, 'I'],
  [377, '²³ςrϵε'],
  [389, '\\ζ/ξτ'],
  [396, 'sJ'],
  [408, '°*?'],
  [450, 'cν'],
  [462, 'zχeγ'],
  [482, 'xδẋ^avyẏg'],
  [493, 'υ$0123456789κ'],
  [510, 'Sλη_oθρ'],
  [526, 'qbβ'],
  [541, 'pdϑkσ'],
  [557, 'µμα'],
  [573, 'PΓu#ϕnh'],
  [590, 'LFπZ'],
  [611, 'TφΣB'],
  [623, 'ψE'],
  [654, 'YΞ×Rω'],
  [672, 'XΔCV'],
  [697, '%<>K'],
  [715, 'ΛAΦ+=G±Ψ−√√'],
  [736, 'D&OQΘN'],
  [754, 'wUΠ'],
  [777, 'HΩΩ'],
  [852, 'm'],
  [896, '…M@'],
  [944, 'W'],
];

const ITALIC: WidthTable = [
  [167, '\u2009'],
  [187, "'"],
  [225, '  '],
  [242, ',.:;'],
  [270, '|ιj!l'],
  [278, '·i'],
  [288, '′f'],
  [298, 't'],
  [313, '{}-'],
  [337, '")('],
  [347, 'I[]ζ'],
  [365, 'ςεs'],
  [376, '²³ξ'],
  [387, 'r/ϵ*'],
  [399, 'τJ°?'],
  [412, 'ce\\'],
  [427, 'zv'],
  [450, 'yẏgxẋ'],
  [470, 'γχδν'],
  [483, '^κo'],
  [499, '6$012345789bkρυλη'],
  [513, 'βϑ_θq'],
  [528, 'pσSa'],
  [545, 'dh'],
  [560, 'μµuαn'],
  [576, 'LPΓ#Fϕ'],
  [592, 'πBφ'],
  [613, 'ZYTEΣR'],
  [634, 'ψΞΔXV'],
  [657, 'K×Cω'],
  [689, 'A%ΛwG'],
  [709, '<>DOQNΘ'],
  [726, '&+=±Ψ−√√ΦU'],
  [750, 'ΠH'],
  [792, 'ΩΩ'],
  [831, 'm…'],
  [869, 'M'],
  [915, 'W@'],
];

const PLAIN: WidthTable = [
  [200, "'|"],
  [250, ',;·′'],
  [300, '.:Iij°²³'],
  [350, '  !l'],
  [400, '"frt'],
  [450, '()-J[s'],
  [500, '=]cz'],
  [525, 'a'],
  [550, '$*/?FLS\\_ekvxy−'],
  [600, '+CEKPTYZbdghnopqu}±'],
  [650, '{0123456789<>ABDGRVXµ'],
  [700, '&HU'],
  [750, 'N^w…'],
  [800, 'OQ×'],
  [850, '#'],
  [900, '%Mm'],
  [950, 'W'],
  [1000, '@'],
];

/** B612 Mono gives every character the same. */
const FIGURES: WidthTable = [];

function byCharacter(table: WidthTable): ReadonlyMap<string, number> {
  return new Map(table.flatMap(([width, characters]) => [...characters].map(character => [character, width] as const)));
}

const TABLES = {
  upright: { widths: byCharacter(UPRIGHT), usual: 600 },
  italic: { widths: byCharacter(ITALIC), usual: 600 },
  plain: { widths: byCharacter(PLAIN), usual: 650 },
  figures: { widths: byCharacter(FIGURES), usual: 650 },
} as const;

/** Type size of a subscript or superscript over that of its line. */
export const SCRIPT_SCALE = 0.7;

/** How far the baseline of a subscript sinks and that of a superscript rises, over the type size. */
export const SCRIPT_SHIFT = { sub: 0.2, sup: 0.36 } as const;

/** Width of a line of text in sheet units, at type size `size`. */
export function textWidth(spans: readonly Span[], size: number, face: Face): number {
  let thousandths = 0;
  for (const { text, italic, script } of spans) {
    const { widths, usual } = TABLES[face === 'math' ? (italic ? 'italic' : 'upright') : face];
    let span = 0;
    for (const character of text) span += widths.get(character) ?? usual;
    thousandths += script === 'normal' ? span : span * SCRIPT_SCALE;
  }
  return (thousandths * size) / 1000;
}
