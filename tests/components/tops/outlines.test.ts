import Drawing from 'dxf-writer';

import { area, boundingBox } from '@/geometry/core/polygon';
import { outlineFromDxf } from '@/components/tops/dxf-outline';
import { outlineToText, parseOutline } from '@/components/tops/outline-text';

/** The corners read, or the sentence. */
function read(text: string) {
  const result = outlineFromDxf(text);
  if (!result.ok) throw new Error(result.message);
  return result.outline;
}

const sizeOf = (outline: Parameters<typeof boundingBox>[0]) => {
  const box = boundingBox(outline);
  return [box.minX, box.maxX, box.minY, box.maxY];
};

describe('a maker’s template from a DXF file', () => {
  it('reads a rectangle of four lines in any order, centred, its front at 0', () => {
    const drawing = new Drawing();
    drawing.setUnits('Inches');
    drawing.drawLine(100, 50, 133, 50);
    drawing.drawLine(133, 72, 100, 72);
    drawing.drawLine(133, 72, 133, 50);
    drawing.drawLine(100, 50, 100, 72);
    const outline = read(drawing.toDxfString());
    expect(outline).toHaveLength(4);
    expect(sizeOf(outline)).toEqual([-16.5, 16.5, 0, 22]);
  });

  it('takes millimeters as the header names them and arcs as arcs: a 20 in slot with round ends', () => {
    const drawing = new Drawing();
    drawing.setUnits('Millimeters');
    // Two straight sides 254 long, half circles of 50.8 radius: 254 x 101.6 + pi 50.8^2 in all.
    drawing.drawLine(0, 0, 254, 0);
    drawing.drawLine(0, 101.6, 254, 101.6);
    drawing.drawArc(254, 50.8, 50.8, -90, 90);
    drawing.drawArc(0, 50.8, 50.8, 90, 270);
    const outline = read(drawing.toDxfString());
    const [minX, maxX, minY, maxY] = sizeOf(outline);
    expect(maxX! - minX!).toBeCloseTo(14, 6);
    expect(maxY! - minY!).toBeCloseTo(4, 2);
    // Chords within 1/128 in of the arcs take a little off.
    expect(Math.abs(area(outline) - (10 * 4 + Math.PI * 4))).toBeLessThan(0.1);
  });

  it('takes the larger of two outlines and the bulge of a polyline', () => {
    const drawing = new Drawing();
    drawing.setUnits('Inches');
    drawing.drawCircle(3, 3, 0.7);
    // A bulge of 1 is half a circle: a square of 10 with a half disc of radius 5 on its right side.
    const half = [10, 0, 1] as unknown as [number, number];
    drawing.drawPolyline([[0, 0], half, [10, 10], [0, 10]], true);
    const outline = read(drawing.toDxfString());
    expect(Math.abs(area(outline) - (100 + (Math.PI * 25) / 2))).toBeLessThan(0.1);
    expect(boundingBox(outline).maxX - boundingBox(outline).minX).toBeCloseTo(15, 1);
  });

  it('says what is wrong with a file that holds no outline, or is none', () => {
    const open = new Drawing();
    open.drawLine(0, 0, 10, 0);
    expect(outlineFromDxf(open.toDxfString())).toEqual({
      ok: false,
      message: 'The file holds no closed outline of lines, arcs, circles or polylines.',
    });
    const none = outlineFromDxf('not a drawing');
    expect(none.ok).toBe(false);
  });
});

describe('a typed outline', () => {
  it('is read a corner a line, fractions and minus signs as on a tape, and written back the same', () => {
    const text = '-16 1/2, 0\n16 1/2, 0\n16 1/2, 22\n-16 1/2, 22';
    const typed = parseOutline(text, '1/16');
    expect(typed).toEqual({ ok: true, outline: [[-16.5, 0], [16.5, 0], [16.5, 22], [-16.5, 22]] }); // prettier-ignore
    expect(typed.ok && outlineToText(typed.outline, '1/16')).toBe(text);
  });

  it('is millimeters in a metric job, parted by commas or semicolons', () => {
    const typed = parseOutline('0; 0\n254, 0\n254; 63.5', '1 mm');
    expect(typed.ok && typed.outline[2]).toEqual([10, 2.5]);
    expect(parseOutline('0; 0\n254; 0\n254; 63,5', '1 mm')).toEqual({
      ok: false,
      message: 'Line 3: Write decimals with a point, not a comma.',
    });
  });

  it('names the line that cannot be read, and why an outline cannot be cut', () => {
    const sentence = (text: string) => {
      const typed = parseOutline(text, '1/16');
      return typed.ok ? null : typed.message;
    };
    expect(sentence('0, 0\n10\n10, 10')).toMatch(/^Line 2: give two lengths with a comma between them/);
    expect(sentence('0, 0\n10, 1/3\n10, 10')).toMatch(/^Line 2: /);
    expect(sentence('0, 0\n10, 0')).toBe('An outline needs at least three corners.');
    expect(sentence('0, 0\n10, 10\n10, 0\n0, 10')).toMatch(/crosses itself/);
    expect(sentence('0, 0\n5, 0\n10, 0')).toBe('The outline has no area.');
  });
});
