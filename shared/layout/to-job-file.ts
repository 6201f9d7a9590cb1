import type { Layout } from '@/geometry/core/layout';

/** The job file of a layout: same words, tape readings as they were typed, everything else in inches. */
export function toJobFile(layout: Layout, name: string): Record<string, unknown> {
  const { room, format: _format, version: _version, units: _units, notes, ...rest } = layout;
  return {
    format: 'offsquare-job',
    version: 1,
    name,
    units: 'in',
    ...rest,
    notes: notes.map(({ photo: _photo, ...note }) => note),
    room: {
      closed: room.closed,
      tapeSd: room.tapeSd,
      walls: room.walls.map(({ length, profile, ...wall }) => ({
        ...wall,
        ...(length.length > 0 && { length: length.length === 1 ? asTyped(length[0]!) : length.map(asTyped) }),
        ...(length[0]?.sd !== undefined && { sd: length[0].sd }),
        ...(profile.length > 0 && { profile }),
      })),
      corners: room.corners.map(({ triangle, ...corner }) => ({
        ...corner,
        ...(triangle && {
          triangle: {
            a: asTyped(triangle.a),
            b: asTyped(triangle.b),
            c: asTyped(triangle.c),
            ...(triangle.c.sd !== undefined && { sd: triangle.c.sd }),
          },
        }),
      })),
      ties: room.ties.map(({ length, ...tie }) => ({
        ...tie,
        length: asTyped(length),
        ...(length.sd !== undefined && { sd: length.sd }),
      })),
      trust: room.trust,
      ignore: room.ignore,
      sketch: room.sketch,
    },
  };
}

/** Text that reads as the same inches in any file: as typed when it names its unit or is plain inches. */
function asTyped(reading: { readonly text: string; readonly value: number }): string | number {
  const plain = Number(reading.text);
  return Number.isFinite(plain) ? reading.value : reading.text;
}
