/**
 * Text that may come from anyone to a document: size and depth, JSON, shape, joining. Each stage reports all it finds and
 * the next is entered only where there was nothing. Never throws.
 */

import { ok, type Result } from '../../problem/index.ts';
import type { Diagram } from '../types.ts';
import { checkJoining } from './joining.ts';
import { readJson } from './json-text.ts';
import { beginReading } from './reading.ts';
import { readShape } from './shape.ts';

/**
 * The document that a diagram file holds (format.md, version 1): at most 4 MiB, 20,000 blocks, groups 32 deep. Fields that
 * the format does not have are passed over; whether expressions mean anything is not asked here, so that half-finished
 * work can be kept and opened.
 */
export function readDiagram(text: string): Result<Diagram> {
  const json = readJson(text);
  if (!json.ok) return json;
  const reading = beginReading();
  const diagram = readShape(json.value, reading);
  if (diagram !== null) checkJoining(diagram, reading);
  if (diagram === null || reading.problems.length > 0) return { ok: false, problems: reading.problems };
  return ok(diagram);
}
