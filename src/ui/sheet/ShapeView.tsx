/** One shape of a block's drawing as SVG; how it looks is the style sheet's matter, by its role. */

import type { Shape, TextShape } from '../../diagram/geometry/index.ts';

export function ShapeView({ shape }: { readonly shape: Shape }) {
  switch (shape.kind) {
    case 'rectangle':
      return (
        <rect
          className={`ink ink-${shape.ink} ink-paper`}
          x={shape.x}
          y={shape.y}
          width={shape.width}
          height={shape.height}
          rx={shape.corner}
        />
      );
    case 'circle':
      return <circle className={`ink ink-${shape.ink} ink-paper`} cx={shape.x} cy={shape.y} r={shape.radius} />;
    case 'line':
      return (
        <polyline className={`ink ink-${shape.ink}`} points={shape.points.map(point => point.join(',')).join(' ')} />
      );
    case 'text':
      return <TextView shape={shape} />;
    default:
      return unreachable(shape);
  }
}

/** Sub- and superscripts: seven tenths of the size, a third of it off the line (common practice in typesetting). */
const SCRIPT_SCALE = 0.7;
const SCRIPT_SHIFT = 0.32;

function TextView({ shape }: { readonly shape: TextShape }) {
  let offset = 0;
  return (
    <text
      className={`writing writing-${shape.face} writing-${shape.role}`}
      x={shape.x}
      y={shape.y}
      textAnchor={shape.anchor}
      fontSize={shape.size}
    >
      {Array.from(shape.spans.entries(), ([place, span]) => {
        const wanted = span.script === 'sub' ? SCRIPT_SHIFT : span.script === 'sup' ? -SCRIPT_SHIFT : 0;
        const dy = (wanted - offset) * shape.size;
        offset = wanted;
        return (
          <tspan
            key={place}
            dy={dy}
            fontStyle={span.italic ? 'italic' : 'normal'}
            fontSize={span.script === 'normal' ? shape.size : shape.size * SCRIPT_SCALE}
          >
            {span.text}
          </tspan>
        );
      })}
    </text>
  );
}

function unreachable(shape: never): never {
  throw new Error(`a shape of no known kind: ${JSON.stringify(shape)}`);
}
