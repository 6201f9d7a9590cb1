import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { IconButton } from '@/components/ui/IconButton';
import { shortcutName, useShortcuts, type Shortcuts } from '@/components/ui/use-shortcuts';

function Page({ shortcuts, active }: { readonly shortcuts: Shortcuts; readonly active?: boolean }) {
  useShortcuts(shortcuts, active);
  return <input aria-label="Find" />;
}

afterEach(() => {
  jest.restoreAllMocks();
  window.localStorage.clear();
});

describe('useShortcuts', () => {
  it('undoes by Ctrl Z, redoes by Shift Ctrl Z, and knows single keys', async () => {
    const [undo, redo, find] = [jest.fn(), jest.fn(), jest.fn()];
    render(<Page shortcuts={{ 'ctrl+z': undo, 'shift+ctrl+z': redo, '/': find }} />);
    await userEvent.keyboard('{Control>}z{/Control}{Control>}{Shift>}Z{/Shift}{/Control}/');
    expect([undo, redo, find].map((act) => act.mock.calls.length)).toEqual([1, 1, 1]);
  });

  it('lets everything be typed into a field', async () => {
    const find = jest.fn();
    render(<Page shortcuts={{ '/': find }} />);
    await userEvent.type(screen.getByRole('textbox'), '1/2');
    expect(find).not.toHaveBeenCalled();
  });

  it('keeps Ctrl keys when single keys are turned off', async () => {
    window.localStorage.setItem('offsquare.setting.anyone.single-keys', 'off');
    const [undo, find] = [jest.fn(), jest.fn()];
    render(<Page shortcuts={{ 'ctrl+z': undo, '/': find }} />);
    await userEvent.keyboard('{Control>}z{/Control}/');
    expect([undo.mock.calls.length, find.mock.calls.length]).toEqual([1, 0]);
  });

  it('names keys as they are written: ? needs no word for Shift', () => {
    const key = { ctrlKey: false, metaKey: false, shiftKey: false, altKey: false };
    expect(shortcutName({ ...key, key: '?', shiftKey: true })).toBe('?');
    expect(shortcutName({ ...key, key: 'R', shiftKey: true })).toBe('r');
    expect(shortcutName({ ...key, key: 'Z', metaKey: true, shiftKey: true })).toBe('shift+ctrl+z');
  });
});

describe('Tooltip', () => {
  it('shows a sign’s name on wide screens while the mouse is over it, and hides it from screen readers', async () => {
    const wide = { matches: true, addEventListener: () => undefined, removeEventListener: () => undefined };
    jest.spyOn(window, 'matchMedia').mockImplementation(() => wide as unknown as MediaQueryList);
    render(<IconButton icon="undo" label="Undo" />);
    expect(screen.queryByText('Undo')).toBeNull();
    await userEvent.hover(screen.getByRole('button', { name: 'Undo' }));
    expect(screen.getByText('Undo').closest('[aria-hidden=true]')).not.toBeNull();
    await userEvent.unhover(screen.getByRole('button', { name: 'Undo' }));
    expect(screen.queryByText('Undo')).toBeNull();
  });
});
