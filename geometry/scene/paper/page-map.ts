import type { Point, Polygon } from '../../core/point';
import { boundingBox } from '../../core/polygon';
import type { PageBuilder } from './page-builder';

/** A box on a page, px. */
export interface PageBox {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

/** Brings a drawing in inches into a box of a page, as large as it goes, in the middle. */
export class PageMap {
  /** px for an inch of the drawing. */
  readonly scale: number;
  private readonly origin: Point;

  constructor(
    private readonly page: PageBuilder,
    outlines: readonly Polygon[],
    box: PageBox,
  ) {
    const { minX, minY, maxX, maxY } = boundingBox(outlines.flat());
    this.scale = Math.min(box.width / Math.max(maxX - minX, 1e-6), box.height / Math.max(maxY - minY, 1e-6));
    this.origin = [
      box.left + (box.width - (maxX - minX) * this.scale) / 2 - minX * this.scale,
      box.top + (box.height - (maxY - minY) * this.scale) / 2 + maxY * this.scale,
    ];
  }

  /** px from the page's top left corner. */
  px([x, y]: Point): Point {
    return [this.origin[0] + x * this.scale, this.origin[1] - y * this.scale];
  }

  /** Place on the page, inches. */
  at(point: Point): Point {
    const [x, y] = this.px(point);
    return this.page.at(x, y);
  }

  outline(points: Polygon): Polygon {
    return points.map((point) => this.at(point));
  }
}
