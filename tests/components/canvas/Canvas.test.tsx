import { act, fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useEffect } from 'react';
import { Circle } from 'react-native-svg';

import { Canvas, type CanvasProps, type CanvasTarget } from '@/components/canvas/Canvas';
import { useViewport, type CanvasView } from '@/components/canvas/use-viewport';

const BOUNDS = { minX: 0, minY: -50, maxX: 100, maxY: 0 };

const TARGETS: readonly CanvasTarget[] = [
  { id: 'A', name: 'Wall A, 100 inches', shape: { kind: 'segment', from: [0, 0], to: [100, 0] } },
  { id: 'B', name: 'Wall B, 50 inches', shape: { kind: 'segment', from: [100, 0], to: [100, -50] } },
  { id: 'seam', name: 'Seam R to S', shape: { kind: 'point', at: [40, -25] }, rank: 2, draggable: true },
];

let canvas: CanvasView;

function Drawing(props: Omit<CanvasProps, 'canvas' | 'children' | 'label' | 'targets'>) {
  const view = useViewport(BOUNDS);
  useEffect(() => {
    canvas = view;
  });
  return (
    <Canvas label="Room" canvas={view} targets={TARGETS} {...props}>
      {(pxPerInch) => <Circle testID="painted" r={pxPerInch} />}
    </Canvas>
  );
}

const root = () => screen.getByRole('group', { name: 'Room' });
const group = () => screen.getByTestId('painted').parentElement!;

/** A canvas of 400 by 200 px, so 4 px an inch; jsdom lays nothing out. */
function draw(props: Partial<CanvasProps> = {}) {
  jest.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockReturnValue(400);
  jest.spyOn(HTMLElement.prototype, 'clientHeight', 'get').mockReturnValue(200);
  const onTap = jest.fn();
  render(<Drawing onTap={onTap} {...props} />);
  return { onTap };
}

const pointer = (type: 'Down' | 'Move' | 'Up' | 'Cancel', x: number, y: number, pointerId = 1) =>
  act(() => {
    fireEvent(
      root(),
      new PointerEvent(`pointer${type.toLowerCase()}`, {
        clientX: x,
        clientY: y,
        pointerId,
        pointerType: 'touch',
        bubbles: true,
      }),
    );
  });

afterEach(() => {
  jest.restoreAllMocks();
  jest.useRealTimers();
});

describe('Canvas', () => {
  it('fits the drawing and says in inches where it was tapped', () => {
    const { onTap } = draw();
    expect(canvas.view).toEqual({ scale: 4, x: 0, y: 0 });
    pointer('Down', 200, 3);
    pointer('Up', 200, 3);
    expect(onTap).toHaveBeenCalledWith('A', [50, -0.75]);
  });

  it('moves the painted group while the finger moves, and tells React once at the end', () => {
    draw();
    pointer('Down', 250, 150);
    pointer('Move', 290, 170);
    expect(group().getAttribute('transform')).toBe('matrix(1 0 0 1 40 20)');
    expect(canvas.view.x).toBe(0);
    pointer('Up', 290, 170);
    expect(canvas.view).toEqual({ scale: 4, x: 40, y: 20 });
    expect(group().getAttribute('transform')).toBe('matrix(1 0 0 1 40 20)');
  });

  it('pinches to twice the scale about the fingers', () => {
    draw();
    pointer('Down', 100, 100, 1);
    pointer('Down', 200, 100, 2);
    pointer('Move', 50, 100, 1);
    pointer('Move', 250, 100, 2);
    pointer('Up', 50, 100, 1);
    pointer('Up', 250, 100, 2);
    expect(canvas.view).toEqual({ scale: 8, x: -150, y: -100 });
    expect(screen.getByTestId('painted').getAttribute('r')).toBe('8');
  });

  it('drags what is draggable in inches from where it began, and Escape drops it', async () => {
    const drags = { onDragStart: jest.fn(), onDrag: jest.fn(), onDragEnd: jest.fn(), onDragCancel: jest.fn() };
    draw(drags);
    pointer('Down', 160, 100);
    pointer('Move', 180, 100);
    expect(drags.onDrag).toHaveBeenLastCalledWith({ target: 'seam', from: [40, -25], to: [45, -25], by: [5, 0] });
    pointer('Move', 200, 104);
    pointer('Up', 200, 104);
    expect(drags.onDragEnd).toHaveBeenCalledWith({ target: 'seam', from: [40, -25], to: [50, -26], by: [10, -1] });
    pointer('Down', 160, 100);
    pointer('Move', 180, 100);
    await userEvent.keyboard('{Escape}');
    pointer('Up', 200, 100);
    expect(drags.onDragCancel).toHaveBeenCalledWith('seam');
    expect(drags.onDragEnd).toHaveBeenCalledTimes(1);
  });

  it('answers a finger that rests for 500 ms', () => {
    jest.useFakeTimers();
    const onHold = jest.fn();
    const { onTap } = draw({ onHold });
    pointer('Down', 160, 100);
    act(() => void jest.advanceTimersByTime(499));
    expect(onHold).not.toHaveBeenCalled();
    act(() => void jest.advanceTimersByTime(1));
    expect(onHold).toHaveBeenCalledWith('seam', [40, -25], [160, 100]);
    pointer('Up', 160, 100);
    expect(onTap).not.toHaveBeenCalled();
  });

  it('zooms about the cursor with the wheel', () => {
    jest.useFakeTimers();
    draw();
    act(() => void fireEvent.wheel(root(), { clientX: 100, clientY: 50, deltaY: -100 }));
    act(() => void jest.advanceTimersByTime(200));
    const { scale, x, y } = canvas.view;
    expect(scale).toBeCloseTo(4.789, 3);
    expect([(100 - x) / scale, (y - 50) / scale]).toEqual([25, -12.5]);
  });

  it('fits again on a double tap', () => {
    draw();
    pointer('Down', 300, 150);
    pointer('Move', 200, 100);
    pointer('Up', 200, 100);
    expect(canvas.view.x).toBe(-100);
    for (let i = 0; i < 2; i++) {
      pointer('Down', 20, 180);
      pointer('Up', 20, 180);
    }
    expect(canvas.view).toEqual({ scale: 4, x: 0, y: 0 });
  });
});

describe('the list twin of a canvas', () => {
  it('offers every thing by name, in the order of the walk', async () => {
    const { onTap } = draw();
    const list = screen.getByRole('list', { name: 'Room, as a list' });
    const names = Array.from(list.querySelectorAll('[role=button]')).map((one) => one.getAttribute('aria-label'));
    expect(names).toEqual(['Wall A, 100 inches', 'Wall B, 50 inches', 'Seam R to S']);
    await userEvent.tab();
    await userEvent.tab();
    await userEvent.keyboard('{Enter}');
    expect(onTap).toHaveBeenCalledWith('B', [100, -25]);
  });

  it('nudges by 1/16 with arrows and by 1 in with Shift, y up', async () => {
    const onNudge = jest.fn();
    draw({ onNudge });
    act(() => screen.getByRole('button', { name: 'Seam R to S' }).focus());
    await userEvent.keyboard('{ArrowRight}{ArrowUp}{Shift>}{ArrowLeft}{/Shift}');
    expect(onNudge.mock.calls).toEqual([
      ['seam', [0.0625, 0]],
      ['seam', [0, 0.0625]],
      ['seam', [-1, 0]],
    ]);
  });

  it('hands on other keys, and the menu key opens the same menu as a long press', async () => {
    const onKey = jest.fn(() => true);
    const onHold = jest.fn();
    draw({ onKey, onHold });
    act(() => screen.getByRole('button', { name: 'Wall A, 100 inches' }).focus());
    await userEvent.keyboard('9{ContextMenu}');
    expect(onKey.mock.calls).toEqual([['9', 'A']]);
    expect(onHold).toHaveBeenCalledWith('A', [50, 0], [200, 0]);
  });

  it('brings a thing out of sight into the middle when the focus comes to it', () => {
    draw();
    pointer('Down', 300, 150);
    pointer('Move', -100, 150);
    pointer('Up', -100, 150);
    act(() => screen.getByRole('button', { name: 'Seam R to S' }).focus());
    expect([canvas.view.x + 40 * 4, canvas.view.y + 25 * 4]).toEqual([200, 100]);
  });
});
