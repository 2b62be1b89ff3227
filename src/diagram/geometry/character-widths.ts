/**
 * Advance widths of the faces in which a sheet is set, so that a block's size is the same in the browser, in a file and in
 * a test, before any font has loaded. Read from the horizontal metrics of the fonts themselves (STIX Two Text regular and
 * italic, B612), in thousandths of the type size, characters within 2 % of each other in one row; a character that is not
 * listed takes the face's usual width.
 */

import type { Span } from '../../expression/index.ts';
import type { Face } from './types.ts';

/** Width, then the characters that have it. */
type WidthTable = readonly (readonly [width: number, characters: string])[];

const UPRIGHT: WidthTable = [
  [187, "'"],
  [235, ' '],
  [167, '\u2009'],
  [245, ',.:;'],
  [263, 'ij!l|·ι'],
  [296, '′'],
  [307, 'f{}'],
  [315, '-t'],
  [343, '()[]'],
  [357, 'I²³ς'],
  [384, 'rε/ζ\\ϵ'],
  [393, 'sτJξ'],
  [408, '*?°'],
  [450, 'cνz'],
  [464, 'eγχ'],
  [480, 'xyvgaδẋẏ^'],
  [497, '0123456789κυ$'],
  [507, 'Sληoθρ_'],
  [522, 'qb'],
  [535, 'βpd'],
  [545, 'kσμµϑ'],
  [562, 'αPΓu'],
  [576, 'nhϕ#'],
  [590, 'LFπZ'],
  [603, 'TφΣ'],
  [621, 'BEψ'],
  [650, 'YΞ×Rω'],
  [668, 'XCΔ'],
  [690, 'V%'],
  [702, '<>K'],
  [720, 'ΛAΦ+=GΨ−±√'],
  [737, 'DOQΘN&'],
  [752, 'wUΠ'],
  [777, 'HΩ'],
  [870, 'mM…'],
  [944, 'W@'],
];

const ITALIC: WidthTable = [
  [187, "'"],
  [225, ' '],
  [167, '\u2009'],
  [242, ',.:;'],
  [273, 'ij!lι|·'],
  [291, 'f′t'],
  [310, '{}-'],
  [343, '()[]I'],
  [364, 'ζεςs'],
  [381, 'ξr/ϵ²³'],
  [398, 'τJ*?°'],
  [410, 'ce'],
  [427, 'zv\\'],
  [449, 'yẏg'],
  [458, 'xẋγχδ'],
  [475, 'νκ^'],
  [490, 'o6'],
  [496, '0123456789b$k'],
  [502, 'ρυλη'],
  [509, 'βϑθ_'],
  [520, 'qp'],
  [530, 'σSad'],
  [552, 'hμµu'],
  [564, 'αnLPΓ'],
  [583, 'Fϕπ'],
  [598, 'Bφ'],
  [607, 'ZYT'],
  [617, 'EΣR'],
  [632, 'ψΞΔ'],
  [656, 'XVKCω×'],
  [690, 'AΛwG%'],
  [707, 'DOQN'],
  [720, 'Θ+=Ψ−±Φ<>√&'],
  [740, 'UΠ'],
  [765, 'HΩ'],
  [830, 'm…'],
  [869, 'M'],
  [915, 'W@'],
];

const PLAIN: WidthTable = [
  [250, ",;·|'"],
  [300, '.:Iij°²³'],
  [350, ' !l'],
  [400, '"frt'],
  [450, '()-J[s'],
  [500, '=]cz'],
  [550, '$*/?FLS\\_`ekvxya−'],
  [600, '+CEKPTYZbdghnopqu}±'],
  [650, '0123456789<>ABDGRVXµ{'],
  [700, '&HU'],
  [750, 'N^w~…'],
  [800, 'OQ×'],
  [900, '#%Mm'],
  [1000, 'W@'],
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
