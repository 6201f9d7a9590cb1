import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';

import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { Sheet } from '@/components/ui/Sheet';
import {
  afterPress,
  draggedHeight,
  restingPosition,
  sheetHeights,
  type SheetPosition,
} from '@/components/ui/sheet-drag';

function NewJob({ onClosed }: { readonly onClosed?: () => void }) {
  const [open, setOpen] = useState(false);
  const close = () => {
    setOpen(false);
    onClosed?.();
  };
  return (
    <>
      <Button label="New job" onPress={() => setOpen(true)} />
      <Button label="Behind" />
      <Dialog open={open} title="New job" onClose={close} actions={<Button label="Start the job" />}>
        <Button label="Inside" />
      </Dialog>
    </>
  );
}

const focused = () => document.activeElement?.getAttribute('aria-label') ?? document.activeElement?.textContent;

describe('Dialog', () => {
  it('takes the focus, keeps Tab inside both ways, and gives the focus back', async () => {
    render(<NewJob />);
    await userEvent.click(screen.getByRole('button', { name: 'New job' }));
    const dialog = screen.getByRole('dialog', { name: 'New job' });
    expect(document.activeElement).toBe(dialog);
    const walk: (string | null | undefined)[] = [];
    for (let i = 0; i < 4; i++) {
      await userEvent.tab();
      walk.push(focused());
    }
    expect(walk).toEqual(['Close', 'Inside', 'Start the job', 'Close']);
    await userEvent.tab({ shift: true });
    expect(focused()).toBe('Start the job');
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('dialog')).toBeNull();
    expect(focused()).toBe('New job');
  });

  it('is closed by Back, before the page is left', async () => {
    const at = window.location.href;
    render(<NewJob />);
    await userEvent.click(screen.getByRole('button', { name: 'New job' }));
    act(() => window.history.back());
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(window.location.href).toBe(at);
  });

  it('costs no press of Back of its own once it has been closed by itself', async () => {
    window.history.pushState({ id: 'jobs' }, '', '/jobs');
    window.history.pushState({ id: 'account' }, '', '/account');
    render(<NewJob />);
    for (let times = 0; times < 2; times++) {
      await userEvent.click(screen.getByRole('button', { name: 'New job' }));
      expect(window.history.state).toEqual({ id: 'account', layer: 1 });
      await userEvent.click(screen.getByRole('button', { name: 'Close' }));
    }
    act(() => window.history.back());
    await waitFor(() => expect(window.history.state).toEqual({ id: 'jobs' }));
    expect(window.location.pathname).toBe('/jobs');
  });

  it('lets Back come from the next page to the page that a dialog was closed on', async () => {
    window.history.pushState({ id: 'jobs' }, '', '/jobs');
    render(<NewJob onClosed={() => window.history.pushState({ id: 'room' }, '', '/room')} />);
    await userEvent.click(screen.getByRole('button', { name: 'New job' }));
    await userEvent.click(screen.getByRole('button', { name: 'Close' }));
    act(() => window.history.back());
    await waitFor(() => expect(window.location.pathname).toBe('/jobs'));
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('does not take back a navigation that follows the closing at once', async () => {
    const goOn = () => window.history.pushState({ page: 'room' }, '', '/room');
    render(<NewJob onClosed={goOn} />);
    await userEvent.click(screen.getByRole('button', { name: 'New job' }));
    await userEvent.click(screen.getByRole('button', { name: 'Close' }));
    await new Promise((resolve) => setTimeout(resolve, 120));
    expect(window.history.state).toEqual({ page: 'room' });
    window.history.replaceState(null, '', '/');
  });
});

function Measuring(props: { readonly modal?: boolean; readonly closable?: boolean }) {
  const [position, setPosition] = useState<SheetPosition | 'closed'>('half');
  if (position === 'closed') return <Button label="Open" onPress={() => setPosition('half')} />;
  return (
    <>
      <Sheet
        label="Wall B"
        position={position}
        onPosition={setPosition}
        onClose={props.closable ? () => setPosition('closed') : undefined}
        modal={props.modal}
        half={472}
      >
        <Button label="Next" />
      </Sheet>
      <Button label="Behind" />
    </>
  );
}

describe('Sheet', () => {
  it('goes from half to full to half by its grab bar, which is a button', async () => {
    render(<Measuring />);
    const sheet = screen.getByRole('region', { name: 'Wall B' });
    expect(sheet.style.height).toBe('472px');
    await userEvent.click(screen.getByRole('button', { name: 'Raise Wall B' }));
    expect(sheet.style.height).toBe(`${window.innerHeight - 56}px`);
    await userEvent.click(screen.getByRole('button', { name: 'Lower Wall B' }));
    expect(sheet.style.height).toBe('472px');
  });

  it('leaves the page behind usable unless it is modal', async () => {
    render(<Measuring />);
    act(() => screen.getByRole('button', { name: 'Next' }).focus());
    await userEvent.tab();
    expect(focused()).toBe('Behind');
  });

  it('keeps the focus inside when modal, and closes by Escape', async () => {
    render(<Measuring modal closable />);
    expect(document.activeElement).toBe(screen.getByRole('dialog', { name: 'Wall B' }));
    const walk: (string | null | undefined)[] = [];
    for (let i = 0; i < 3; i++) {
      await userEvent.tab();
      walk.push(focused());
    }
    expect(walk).toEqual(['Raise Wall B', 'Next', 'Raise Wall B']);
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('dialog')).toBeNull();
  });

  it('goes down to peek by Escape when it cannot be closed', async () => {
    render(<Measuring />);
    act(() => screen.getByRole('button', { name: 'Next' }).focus());
    await userEvent.keyboard('{Escape}');
    expect(screen.getByRole('region', { name: 'Wall B' }).style.height).toBe('84px');
  });

  it('follows the finger that drags it and comes to rest at the nearest height', () => {
    render(<Measuring />);
    const bar = screen.getByRole('button', { name: 'Raise Wall B' });
    const sheet = screen.getByRole('region', { name: 'Wall B' });
    const finger = (type: string, clientY: number, timeStamp: number) => {
      const event = new PointerEvent(type, { clientY, pointerId: 1, button: 0, bubbles: true });
      Object.defineProperty(event, 'timeStamp', { value: timeStamp });
      fireEvent(bar, event);
    };
    finger('pointerdown', 300, 0);
    finger('pointermove', 500, 1000);
    expect(sheet.style.height).toBe('272px');
    finger('pointermove', 640, 3000);
    finger('pointerup', 640, 3010);
    expect(sheet.style.height).toBe('84px');
  });
});

describe('sheet heights', () => {
  const heights = sheetHeights(844, 472);

  it('are 84, what the content asks for, and all but 56', () => {
    expect(heights).toEqual({ peek: 84, half: 472, full: 788 });
    expect(sheetHeights(844).half).toBe(473);
    expect(sheetHeights(320, 472)).toEqual({ peek: 84, half: 320, full: 320 });
  });

  it('stop at full and give way by half under peek', () => {
    expect(draggedHeight(472, -400, heights)).toBe(788);
    expect(draggedHeight(84, 40, heights)).toBe(64);
  });

  it('rest where a flick of 160 ms would carry them', () => {
    expect(restingPosition(472, 0, heights, true)).toBe('half');
    expect(restingPosition(472, 1.2, heights, true)).toBe('full');
    expect(restingPosition(472, -1.5, heights, true)).toBe('peek');
    expect(restingPosition(50, 0, heights, true)).toBe('closed');
    expect(restingPosition(50, 0, heights, false)).toBe('peek');
  });

  it('go half, full, half by pressing', () => {
    expect([afterPress('peek'), afterPress('half'), afterPress('full')]).toEqual(['half', 'full', 'half']);
  });
});
