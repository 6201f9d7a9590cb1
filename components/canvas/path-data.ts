import type { Path } from '@/geometry/scene/primitives/primitive';

/** An SVG path of the segments, to a hundredth of a px. */
export function pathData(path: Path): string {
  let data = '';
  for (const segment of path) {
    data += segment[0];
    for (let i = 1; i < segment.length; i++)
      data += `${i > 1 ? ' ' : ''}${Math.round((segment[i] as number) * 100) / 100}`;
  }
  return data;
}
