import { arcOf, type ArcPath } from '../core/arc-path';
import { drawingBox, FILE_LAYERS, type FileDrawing, type FileEntity, type FileLayer } from './drawing';

/** Inches of paper round the drawing. */
const MARGIN = 1;

const STROKES: Readonly<Partial<Record<FileLayer, string>>> = {
  WALLS: 'stroke-width="0.06"',
  SEAMS: 'stroke-dasharray="0.5 0.25"',
  GRAIN: 'stroke-dasharray="1 0.5"',
  MARKS: 'stroke-dasharray="0.25 0.25"',
};

/**
 * A drawing as an SVG file at its true size: `width` and `height` in inches, one unit of the view box an inch, y turned
 * to point down. A group for each layer; arcs are arcs.
 */
export function writeSvg(drawing: FileDrawing): string {
  const box = drawingBox(drawing);
  const width = box.maxX - box.minX + 2 * MARGIN;
  const height = box.maxY - box.minY + 2 * MARGIN;
  const view = `${number(box.minX - MARGIN)} ${number(-box.maxY - MARGIN)} ${number(width)} ${number(height)}`;
  const groups = (Object.keys(FILE_LAYERS) as FileLayer[]).flatMap((layer) => {
    const inside = drawing.entities.filter((entity) => entity.layer === layer);
    if (inside.length === 0) return [];
    const look = layer === 'LETTERS' ? 'fill="#000" stroke="none"' : `fill="none" ${STROKES[layer] ?? ''}`.trim();
    return [`  <g id="${layer}" ${look}>`, ...inside.map((entity) => `    ${element(entity)}`), '  </g>'];
  });
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<svg xmlns="http://www.w3.org/2000/svg" width="${number(width)}in" height="${number(height)}in" viewBox="${view}" stroke="#000" stroke-width="0.03" font-family="sans-serif">`,
    `  <title>${escapeXml(drawing.title)}</title>`,
    '  <desc>Lengths are inches, one unit an inch.</desc>',
    ...groups,
    '</svg>',
    '',
  ].join('\n');
}

function element(entity: FileEntity): string {
  if (entity.kind === 'path') return `<path d="${pathData(entity.path)}"/>`;
  const [x, y] = entity.at;
  const place = `x="${number(x)}" y="${number(-y)}" font-size="${number(entity.height)}"`;
  return `<text ${place} text-anchor="middle" dominant-baseline="central">${escapeXml(entity.text)}</text>`;
}

function pathData({ vertices, closed }: ArcPath): string {
  const first = vertices[0];
  if (!first) return '';
  const legs = vertices.flatMap(({ at, bulge }, i) => {
    const last = i === vertices.length - 1;
    if (last && (!closed || bulge === 0)) return [];
    const to = vertices[(i + 1) % vertices.length]!.at;
    const place = `${number(to[0])} ${number(-to[1])}`;
    const arc = arcOf(at, to, bulge);
    if (!arc) return [`L ${place}`];
    const large = Math.abs(arc.sweep) > Math.PI ? 1 : 0;
    return [`A ${number(arc.radius)} ${number(arc.radius)} 0 ${large} ${arc.sweep > 0 ? 0 : 1} ${place}`];
  });
  return [`M ${number(first.at[0])} ${number(-first.at[1])}`, ...legs, ...(closed ? ['Z'] : [])].join(' ');
}

function number(value: number): string {
  return String(Math.round(value * 1e8) / 1e8 || 0);
}

/** Text that XML takes: its own signs escaped, characters it forbids left out. */
export function escapeXml(text: string): string {
  const signs: Readonly<Record<string, string>> = {
    '&': '&amp;',
    '<': '&lt;',
    '>': '&gt;',
    '"': '&quot;',
    "'": '&#39;',
  };
  return text
    .replaceAll(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, '')
    .replaceAll(/[&<>"']/g, (c) => signs[c]!);
}
