import {
  IDLE,
  stepGesture,
  type GestureContext,
  type GestureEffect,
  type GestureEvent,
  type GestureState,
  type GestureTarget,
} from '@/components/canvas/canvas-gesture';
import { toScreen, toWorld, type ScreenPoint, type Viewport } from '@/components/canvas/viewport';

const START: Viewport = { scale: 4, x: 100, y: 300 };

/** Feeds events and keeps the view as the canvas would. */
class Fingers {
  state: GestureState = IDLE;
  view: Viewport = START;
  readonly effects: GestureEffect[] = [];

  feed(event: GestureEvent): this {
    const context: GestureContext = { view: this.view, fitScale: 4 };
    const step = stepGesture(this.state, event, context);
    this.state = step.state;
    for (const effect of step.effects) {
      if (effect.kind === 'show') this.view = effect.view;
      this.effects.push(effect);
    }
    return this;
  }

  down(at: ScreenPoint, target: GestureTarget | null = null, pointer = 1): this {
    return this.feed({ kind: 'down', pointer, at, touch: true, target });
  }

  move(at: ScreenPoint, pointer = 1): this {
    return this.feed({ kind: 'move', pointer, at });
  }

  up(at: ScreenPoint, time = 0, pointer = 1): this {
    return this.feed({ kind: 'up', pointer, at, time });
  }

  kinds(): string[] {
    return this.effects.map((effect) => (effect.kind === 'drag' ? `drag ${effect.phase}` : effect.kind));
  }
}

const WALL: GestureTarget = { id: 'wall', draggable: false };
const SEAM: GestureTarget = { id: 'seam', draggable: true };

describe('a pan', () => {
  it('moves by exactly what the finger moved, the slop counted in', () => {
    const fingers = new Fingers().down([50, 50]).move([53, 50]).move([90, 100]).up([90, 100]);
    expect(fingers.view).toEqual({ scale: 4, x: 140, y: 350 });
    expect(fingers.kinds()).toEqual(['show', 'settle']);
  });

  it('starts on a thing that cannot be dragged, too', () => {
    expect(new Fingers().down([50, 50], WALL).move([70, 50]).up([70, 50]).view.x).toBe(120);
  });

  it('goes back to where it began when it is cancelled, and the finger is then ignored', () => {
    const fingers = new Fingers().down([50, 50]).move([90, 100]).feed({ kind: 'cancel' }).move([300, 300]);
    expect(fingers.view).toEqual(START);
    expect(fingers.up([300, 300]).state).toEqual(IDLE);
  });
});

describe('a pinch', () => {
  it('doubles and triples exactly, about the middle of the fingers', () => {
    const fingers = new Fingers().down([100, 200]).down([200, 200], null, 2);
    const middle = toWorld(START, [150, 200]);
    fingers.move([50, 200]).move([250, 200], 2);
    expect(fingers.view.scale).toBe(8);
    expect(toScreen(fingers.view, middle)).toEqual([150, 200]);
    fingers.move([0, 200]).move([300, 200], 2);
    expect(fingers.view.scale).toBe(12);
    expect(toScreen(fingers.view, middle)).toEqual([150, 200]);
  });

  it('goes on as a pan with the finger that stays', () => {
    const fingers = new Fingers().down([100, 200]).down([200, 200], null, 2).move([50, 200]).move([250, 200], 2);
    const pinched = fingers.view;
    fingers.up([50, 200]).move([260, 215], 2).up([260, 215], 0, 2);
    expect(fingers.view).toEqual({ ...pinched, x: pinched.x + 10, y: pinched.y + 15 });
    expect(fingers.state).toEqual(IDLE);
  });

  it('starts out of a pan from where the first finger is now', () => {
    const fingers = new Fingers().down([100, 200]).move([120, 240]).down([220, 240], null, 2);
    const middle = toWorld(fingers.view, [170, 240]);
    fingers.move([70, 240]).move([270, 240], 2);
    expect(fingers.view.scale).toBe(8);
    expect(toScreen(fingers.view, middle)).toEqual([170, 240]);
  });

  it('calls a drag off', () => {
    const fingers = new Fingers().down([100, 200], SEAM).move([150, 200]).down([250, 200], null, 2);
    expect(fingers.kinds()).toEqual(['drag start', 'drag move', 'dragCancel']);
  });

  it('takes no third finger', () => {
    const fingers = new Fingers()
      .down([100, 200])
      .down([200, 200], null, 2)
      .down([300, 300], null, 3)
      .move([400, 400], 3);
    expect(fingers.view).toEqual(START);
  });
});

describe('a tap', () => {
  it('names what it hit, also when the finger trembles within 8 px', () => {
    const fingers = new Fingers().down([50, 50], WALL).move([55, 54]).up([55, 54]);
    expect(fingers.effects).toEqual([{ kind: 'tap', target: 'wall', at: [50, 50] }]);
  });

  it('fits on a double tap within 300 ms and 24 px', () => {
    const twice = (time: number, at: ScreenPoint) =>
      new Fingers().down([50, 50]).up([50, 50], 0).down(at).up(at, time).kinds();
    expect(twice(300, [60, 60])).toEqual(['tap', 'fit']);
    expect(twice(301, [60, 60])).toEqual(['tap', 'tap']);
    expect(twice(200, [80, 50])).toEqual(['tap', 'tap']);
  });

  it('taps two things in quick succession as two taps', () => {
    const fingers = new Fingers().down([50, 50], WALL).up([50, 50], 0).down([55, 50], SEAM).up([55, 50], 100);
    expect(fingers.kinds()).toEqual(['tap', 'tap']);
  });

  it('becomes a long press when the finger stays, and no tap follows', () => {
    const fingers = new Fingers().down([50, 50], WALL).feed({ kind: 'held' }).move([200, 200]).up([200, 200]);
    expect(fingers.effects).toEqual([{ kind: 'hold', target: 'wall', at: [50, 50] }]);
  });

  it('does not become a long press once the finger has moved on', () => {
    const fingers = new Fingers().down([50, 50]).move([90, 50]).feed({ kind: 'held' });
    expect(fingers.kinds()).toEqual(['show']);
  });
});

describe('a drag', () => {
  it('always gives where it began and where it is, so that moves cannot add up wrongly', () => {
    const fingers = new Fingers().down([50, 50], SEAM).move([60, 50]).move([80, 50]).move([70, 52]).up([71, 52]);
    expect(fingers.effects).toEqual([
      { kind: 'drag', phase: 'start', target: 'seam', from: [50, 50], to: [50, 50] },
      { kind: 'drag', phase: 'move', target: 'seam', from: [50, 50], to: [60, 50] },
      { kind: 'drag', phase: 'move', target: 'seam', from: [50, 50], to: [80, 50] },
      { kind: 'drag', phase: 'move', target: 'seam', from: [50, 50], to: [70, 52] },
      { kind: 'drag', phase: 'end', target: 'seam', from: [50, 50], to: [71, 52] },
    ]);
    expect(fingers.view).toEqual(START);
  });

  it('is dropped by Escape, and lifting the finger then makes no edit', () => {
    const fingers = new Fingers().down([50, 50], SEAM).move([80, 50]).feed({ kind: 'cancel' }).up([90, 50]);
    expect(fingers.kinds()).toEqual(['drag start', 'drag move', 'dragCancel']);
  });

  it('is a tap when the finger did not move', () => {
    expect(new Fingers().down([50, 50], SEAM).up([50, 50]).kinds()).toEqual(['tap']);
  });
});

describe('the wheel', () => {
  it('zooms about the cursor, and not in the middle of a gesture', () => {
    const fingers = new Fingers();
    const under = toWorld(START, [220, 140]);
    fingers.feed({ kind: 'wheel', at: [220, 140], factor: 1.5 });
    expect(fingers.view.scale).toBe(6);
    expect(toScreen(fingers.view, under)).toEqual([220, 140]);
    const view = fingers.view;
    fingers.down([50, 50]).feed({ kind: 'wheel', at: [0, 0], factor: 2 });
    expect(fingers.view).toEqual(view);
  });
});
