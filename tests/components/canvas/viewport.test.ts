import fc from 'fast-check';

import {
  centreOn,
  fitView,
  groupTransform,
  midpoint,
  panView,
  pinchView,
  toScreen,
  toWorld,
  wheelFactor,
  zoomAbout,
  type ScreenPoint,
  type Viewport,
} from '@/components/canvas/viewport';

const view: fc.Arbitrary<Viewport> = fc.record({
  scale: fc.double({ min: 0.2, max: 60, noNaN: true }),
  x: fc.double({ min: -2000, max: 2000, noNaN: true }),
  y: fc.double({ min: -2000, max: 2000, noNaN: true }),
});
const coordinate = fc.double({ min: -1500, max: 1500, noNaN: true });
const point = fc.tuple(coordinate, coordinate);

/** px; 1500 px at 60 px an inch keep 12 digits in a double, so a millionth is generous. */
const EXACT = 1e-6;

function expectNear(a: ScreenPoint, b: ScreenPoint): void {
  expect(Math.abs(a[0] - b[0])).toBeLessThan(EXACT);
  expect(Math.abs(a[1] - b[1])).toBeLessThan(EXACT);
}

describe('the viewport', () => {
  it('puts y up: 10 in right and 5 in up at 4 px an inch is 40 px right and 20 px up', () => {
    expect(toScreen({ scale: 4, x: 100, y: 200 }, [10, 5])).toEqual([140, 180]);
    expect(toWorld({ scale: 4, x: 100, y: 200 }, [140, 180])).toEqual([10, 5]);
  });

  it('comes back to the same px through inches', () => {
    fc.assert(
      fc.property(view, point, (v, at) => expectNear(toScreen(v, toWorld(v, at)), at)),
      { seed: 41, numRuns: 300 },
    );
  });

  it('moves every point by the px panned', () => {
    fc.assert(
      fc.property(view, point, point, (v, at, [dx, dy]) => {
        expectNear(toScreen(panView(v, dx, dy), toWorld(v, at)), [at[0] + dx, at[1] + dy]);
      }),
      { seed: 42, numRuns: 200 },
    );
  });
});

describe('zoomAbout', () => {
  it('keeps what lies under the cursor, at any factor', () => {
    fc.assert(
      fc.property(view, point, fc.double({ min: 0.1, max: 10, noNaN: true }), (v, at, factor) => {
        const zoomed = zoomAbout(v, at, factor, v.scale);
        expectNear(toScreen(zoomed, toWorld(v, at)), at);
      }),
      { seed: 43, numRuns: 200 },
    );
  });

  it('stops at 0.5 and 8 times the fitted scale', () => {
    const v = { scale: 4, x: 0, y: 0 };
    expect(zoomAbout(v, [0, 0], 100, 4).scale).toBe(32);
    expect(zoomAbout(v, [0, 0], 0.01, 4).scale).toBe(2);
    expect(zoomAbout(v, [0, 0], 2, 4).scale).toBe(8);
  });
});

describe('pinchView', () => {
  it('doubles the scale when the fingers go twice as far apart, about their middle', () => {
    const start = { scale: 4, x: 50, y: 300 };
    const pinched = pinchView(
      start,
      [
        [100, 200],
        [200, 200],
      ],
      [
        [50, 200],
        [250, 200],
      ],
      4,
    );
    expect(pinched.scale).toBe(8);
    expectNear(toScreen(pinched, toWorld(start, [150, 200])), [150, 200]);
  });

  it('keeps the point between the fingers between them, wherever they go', () => {
    fc.assert(
      fc.property(view, point, point, point, point, (v, a, b, c, d) => {
        const pinched = pinchView(v, [a, b], [c, d], v.scale);
        expectNear(toScreen(pinched, toWorld(v, midpoint(a, b))), midpoint(c, d));
      }),
      { seed: 44, numRuns: 300 },
    );
  });

  it('keeps both touched points under both fingers while the scale is free and the fingers do not turn', () => {
    fc.assert(
      fc.property(
        view,
        point,
        fc.double({ min: 40, max: 300, noNaN: true }),
        fc.double({ min: 0.6, max: 3, noNaN: true }),
        (v, a, apart, k) => {
          const b: ScreenPoint = [a[0] + apart, a[1]];
          const c: ScreenPoint = [a[0] - 7, a[1] + 11];
          const d: ScreenPoint = [c[0] + apart * k, c[1]];
          const pinched = pinchView(v, [a, b], [c, d], v.scale);
          expectNear(toScreen(pinched, toWorld(v, a)), c);
          expectNear(toScreen(pinched, toWorld(v, b)), d);
        },
      ),
      { seed: 45, numRuns: 200 },
    );
  });

  it('only moves when both fingers came down on one spot', () => {
    const start = { scale: 4, x: 0, y: 0 };
    expect(
      pinchView(
        start,
        [
          [10, 10],
          [10, 10],
        ],
        [
          [0, 0],
          [40, 40],
        ],
        4,
      ),
    ).toEqual({ scale: 4, x: 10, y: 10 });
  });
});

describe('fitView', () => {
  const room = { minX: 0, minY: -84, maxX: 118, maxY: 0 };

  it('shows the whole drawing inside the insets, as big as it goes', () => {
    const insets = { top: 60, right: 20, bottom: 472, left: 20 };
    const fitted = fitView(room, { width: 390, height: 844 }, insets);
    const corners = [toScreen(fitted, [0, 0]), toScreen(fitted, [118, -84])];
    expect(fitted.scale).toBeCloseTo(350 / 118, 10);
    expectNear(corners[0]!, [20, 60 + (312 - 84 * fitted.scale) / 2]);
    expectNear(corners[1]!, [370, 60 + (312 + 84 * fitted.scale) / 2]);
  });

  it('uses the whole canvas where the insets leave nothing, and draws a point as an inch', () => {
    const insets = { top: 500, right: 0, bottom: 500, left: 0 };
    const fitted = fitView({ minX: 3, minY: 3, maxX: 3, maxY: 3 }, { width: 100, height: 200 }, insets);
    expect(fitted.scale).toBe(100);
    expectNear(toScreen(fitted, [3, 3]), [50, 100]);
  });
});

describe('centreOn', () => {
  it('puts a place in the middle of what a sheet leaves', () => {
    const insets = { top: 64, right: 0, bottom: 400, left: 0 };
    const centred = centreOn({ scale: 3, x: 0, y: 0 }, [12, -30], { width: 390, height: 844 }, insets);
    expectNear(toScreen(centred, [12, -30]), [195, 64 + 380 / 2]);
  });
});

describe('groupTransform', () => {
  it('places what was painted at one scale as another view says', () => {
    expect(groupTransform(4, { scale: 6, x: 10, y: 20 })).toBe('matrix(1.5 0 0 1.5 10 20)');
  });
});

describe('wheelFactor', () => {
  it('zooms in by about 1.2 for a notch of 100 px, and out by the same', () => {
    expect(wheelFactor(-100, 0)).toBeCloseTo(1.197, 3);
    expect(wheelFactor(-100, 0) * wheelFactor(100, 0)).toBeCloseTo(1, 12);
  });

  it('takes lines and pages for what they are, and no turn is more than about 2', () => {
    expect(wheelFactor(-3, 1)).toBeCloseTo(wheelFactor(-48, 0), 12);
    expect(wheelFactor(-1e6, 0)).toBeLessThan(2.1);
  });
});
