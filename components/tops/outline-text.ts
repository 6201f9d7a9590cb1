import type { Step } from '@/geometry/core/layout';
import type { Point, Polygon } from '@/geometry/core/point';
import { area } from '@/geometry/core/polygon';
import { formatLength } from '@/geometry/tape/format-length';
import { parseSignedLength } from '@/geometry/tape/parse-length';
import { crossesItself } from '@/geometry/top/simple-polygon';

/** An outline as it is typed: a corner a line, "36 1/2, 0". */
export function outlineToText(outline: Polygon, step: Step): string {
  const write = (inches: number) => formatLength(inches, step).replace(/ mm$/, '');
  return outline.map(([x, y]) => `${write(x)}, ${write(y)}`).join('\n');
}

export type TypedOutline =
  { readonly ok: true; readonly outline: Polygon } | { readonly ok: false; readonly message: string };

/** Corners a template may have; more come from a file. */
const MOST = 400;

/**
 * Reads an outline typed a corner a line, x and y parted by a comma or a semicolon.
 *
 * @param step - millimeters where it is a metric one
 * @returns the corners in inches, or a sentence that names the line
 */
export function parseOutline(text: string, step: Step): TypedOutline {
  const lines = text.split('\n').map((line) => line.trim());
  const points: Point[] = [];
  for (const [i, line] of lines.entries()) {
    if (line === '') continue;
    // Between semicolons a decimal comma is told from the one that parts two lengths, and named.
    const parts = line.split(line.includes(';') ? ';' : ',');
    if (parts.length !== 2)
      return refused(`Line ${i + 1}: give two lengths with a comma between them, such as 36 1/2, 0.`);
    const units = step.endsWith('mm') ? 'mm' : 'in';
    const [x, y] = parts.map((part) => parseSignedLength(part.trim(), units));
    if (!x!.ok) return refused(`Line ${i + 1}: ${x!.message}`);
    if (!y!.ok) return refused(`Line ${i + 1}: ${y!.message}`);
    points.push([x!.value, y!.value]);
  }
  const why = outlineProblem(points);
  return why === null ? { ok: true, outline: points } : refused(why);
}

/** Why an outline cannot be cut, or null. */
export function outlineProblem(outline: Polygon): string | null {
  if (outline.length < 3) return 'An outline needs at least three corners.';
  if (outline.length > MOST) return `An outline may have ${MOST} corners; this one has ${outline.length}.`;
  if (crossesItself(outline))
    return 'The outline crosses itself. Give its corners in the order a pencil would go round.';
  return area(outline) > 1e-6 ? null : 'The outline has no area.';
}

const refused = (message: string): TypedOutline => ({ ok: false, message });
