import DxfParser, { type ICircleEntity, type IEntity, type ILwpolylineEntity, type ITextEntity } from 'dxf-parser';

import type { Point } from '@/geometry/core/point';

/** A polyline or circle as the reader gives it. */
export interface ReadShape {
  readonly layer: string;
  readonly points: readonly Point[];
  readonly closed: boolean;
  /** Square inches, arcs included; worked out here from the bulges. */
  readonly area: number;
  /** Radii of its arcs, inches, in order. */
  readonly radii: readonly number[];
}

export interface ReadDxf {
  readonly units: number;
  readonly version: string;
  readonly layers: readonly string[];
  readonly shapes: readonly ReadShape[];
  readonly texts: readonly string[];
}

/** Reads a DXF with a package that shares nothing with the writer. */
export function readDxf(text: string): ReadDxf {
  const file = new DxfParser().parseSync(text);
  if (!file) throw new Error('the reader gave nothing');
  const header = file.header as Record<string, unknown>;
  return {
    units: Number(header['$INSUNITS']),
    version: String(header['$ACADVER']),
    layers: Object.keys(file.tables.layer.layers),
    shapes: file.entities.flatMap(shapeOf),
    texts: file.entities.filter((e) => e.type === 'TEXT').map((e) => (e as ITextEntity).text),
  };
}

function shapeOf(entity: IEntity): ReadShape[] {
  if (entity.type === 'CIRCLE') {
    const { center, radius } = entity as ICircleEntity;
    const area = Math.PI * radius * radius;
    return [{ layer: entity.layer, points: [[center.x, center.y]], closed: true, area, radii: [radius] }];
  }
  if (entity.type !== 'LWPOLYLINE') return [];
  const { vertices, shape } = entity as ILwpolylineEntity;
  let area = 0;
  const radii: number[] = [];
  vertices.forEach((a, i) => {
    if (!shape && i === vertices.length - 1) return;
    const b = vertices[(i + 1) % vertices.length]!;
    area += (a.x * b.y - b.x * a.y) / 2;
    const bulge = a.bulge ?? 0;
    if (bulge === 0) return;
    // Textbook: r = c (1 + b²) / (4 |b|), and the segment between chord and arc is r² (θ - sin θ) / 2.
    const chord = Math.hypot(b.x - a.x, b.y - a.y);
    const radius = (chord * (1 + bulge * bulge)) / (4 * Math.abs(bulge));
    const sweep = 4 * Math.atan(bulge);
    area += (radius * radius * (sweep - Math.sin(sweep))) / 2;
    radii.push(radius);
  });
  return [{ layer: entity.layer, points: vertices.map((v): Point => [v.x, v.y]), closed: shape, area, radii }];
}
