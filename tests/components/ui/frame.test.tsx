import { act, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { AppShell } from '@/components/ui/AppShell';
import { ErrorBoundary } from '@/components/ui/ErrorBoundary';
import type { NavItem } from '@/components/ui/nav-item';
import { PageFrame } from '@/components/ui/PageFrame';
import { Text } from '@/components/ui/Text';
import { ThemeProvider, useTheme } from '@/components/ui/ThemeProvider';
import { ToastProvider, useToast } from '@/components/ui/ToastProvider';

const SECTIONS: readonly NavItem[] = [
  { key: 'jobs', label: 'Jobs', icon: 'jobs', href: '/jobs', current: true },
  { key: 'rack', label: 'Rack', icon: 'rack', href: '/rack' },
];

const STEPS: readonly NavItem[] = [
  { key: 'room', label: 'Room', icon: 'room', href: '/jobs/1/room', current: true },
  { key: 'tops', label: 'Tops', icon: 'tops', href: '/jobs/1/tops', count: 3 },
];

function screenWidth(px: number, dark = false) {
  const media = (query: string) => ({
    media: query,
    matches: query.includes('dark') ? dark : Number(/min-width: (\d+)px/.exec(query)?.[1] ?? Infinity) <= px,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  });
  jest.spyOn(window, 'matchMedia').mockImplementation(media as unknown as typeof window.matchMedia);
}

function show({ steps, barHidden }: { readonly steps?: readonly NavItem[]; readonly barHidden?: boolean } = {}) {
  const onNavigate = jest.fn();
  const { rerender } = render(<Page steps={steps} barHidden={barHidden} onNavigate={onNavigate} />);
  return {
    onNavigate,
    again: (hidden: boolean) => rerender(<Page steps={steps} barHidden={hidden} onNavigate={onNavigate} />),
  };
}

function Page(props: {
  readonly steps?: readonly NavItem[];
  readonly barHidden?: boolean;
  readonly onNavigate: (href: string) => void;
}) {
  return (
    <AppShell sections={SECTIONS} onNavigate={props.onNavigate}>
      <PageFrame title="Scullery" inspector={<Text>Wall B</Text>} {...props}>
        <Text>Drawing</Text>
      </PageFrame>
    </AppShell>
  );
}

const bars = () => screen.queryAllByRole('navigation').map((bar) => bar.getAttribute('aria-label'));

afterEach(() => {
  jest.restoreAllMocks();
  window.localStorage.clear();
  delete document.documentElement.dataset.theme;
});

describe('the frame of a page', () => {
  it('has a rail, steps across the top and an inspector from 900 px on', () => {
    screenWidth(900);
    show({ steps: STEPS });
    expect(bars()).toEqual(['Sections', 'Steps of this job']);
    expect(screen.getByText('Wall B')).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Jobs' }).getAttribute('aria-current')).toBe('page');
  });

  it('has the sections at the foot of a phone, and in a job its steps instead', () => {
    screenWidth(390);
    const { onNavigate } = show();
    expect(bars()).toEqual(['Sections']);
    expect(screen.queryByText('Wall B')).toBeNull();
    expect(onNavigate).not.toHaveBeenCalled();
  });

  it('has the steps of a job at the foot of a phone, and takes them away while the pad is open', () => {
    screenWidth(390);
    const { again } = show({ steps: STEPS });
    expect(bars()).toEqual(['Steps of this job']);
    again(true);
    expect(bars()).toEqual([]);
    again(false);
    expect(bars()).toEqual(['Steps of this job']);
  });

  it('says how many findings wait, and goes where it is told', async () => {
    screenWidth(390);
    const { onNavigate } = show({ steps: STEPS });
    const tops = within(screen.getByRole('navigation')).getByRole('link', { name: 'Tops, 3 to look at' });
    expect(tops.getAttribute('href')).toBe('/jobs/1/tops');
    await userEvent.click(tops);
    expect(onNavigate).toHaveBeenCalledWith('/jobs/1/tops');
  });

  it('lets the keyboard skip to the content', async () => {
    screenWidth(1440);
    show();
    await userEvent.tab();
    expect(document.activeElement?.textContent).toBe('Skip to content');
    await userEvent.keyboard('{Enter}');
    expect(document.activeElement).toBe(screen.getByRole('main'));
  });

  it('has one first heading and the landmarks', () => {
    screenWidth(1440);
    show({ steps: STEPS });
    expect(screen.getAllByRole('heading', { level: 1 }).map((head) => head.textContent)).toEqual(['Scullery']);
    expect(screen.getByRole('banner')).toBeTruthy();
  });
});

function Chooser() {
  const { name, choice, setChoice } = useTheme();
  return (
    <>
      <Text>{`${choice}: ${name}`}</Text>
      <button onClick={() => setChoice('light')}>Light</button>
      <button onClick={() => setChoice('system')}>System</button>
    </>
  );
}

describe('ThemeProvider', () => {
  it('follows the device until the person decides, and keeps that for the person', async () => {
    screenWidth(390, true);
    const { unmount } = render(
      <ThemeProvider personId="renn">
        <Chooser />
      </ThemeProvider>,
    );
    expect(screen.getByText('system: dark')).toBeTruthy();
    expect(document.documentElement.dataset.theme).toBeUndefined();
    await userEvent.click(screen.getByText('Light'));
    expect(screen.getByText('light: light')).toBeTruthy();
    expect(document.documentElement.dataset.theme).toBe('light');
    unmount();
    render(
      <ThemeProvider personId="sol">
        <Chooser />
      </ThemeProvider>,
    );
    expect(screen.getByText('system: dark')).toBeTruthy();
    expect(document.documentElement.dataset.theme).toBeUndefined();
    render(
      <ThemeProvider personId="renn">
        <Chooser />
      </ThemeProvider>,
    );
    expect(screen.getByText('light: light')).toBeTruthy();
  });
});

function Undoer({ tone }: { readonly tone?: 'failure' }) {
  const toast = useToast();
  return (
    <button
      onClick={() =>
        toast({
          text: 'Undid wall C, 84 3/4',
          tone,
          action: { label: 'Redo', onPress: () => toast({ text: 'Redid it' }) },
        })
      }
    >
      Undo
    </button>
  );
}

describe('ToastProvider', () => {
  it('reads a toast out, offers its act, and puts it away after 6 s', async () => {
    jest.useFakeTimers();
    const user = userEvent.setup({ advanceTimers: jest.advanceTimersByTime });
    render(
      <ToastProvider>
        <Undoer />
      </ToastProvider>,
    );
    await user.click(screen.getByText('Undo'));
    expect(screen.getByRole('status').textContent).toContain('Undid wall C, 84 3/4');
    await user.click(screen.getByRole('button', { name: 'Redo' }));
    expect(screen.getByRole('status').textContent).toBe('Redid it');
    act(() => void jest.advanceTimersByTime(6000));
    expect(screen.getByRole('status').textContent).toBe('');
    jest.useRealTimers();
  });

  it('keeps a failure until it is closed', async () => {
    jest.useFakeTimers();
    const user = userEvent.setup({ advanceTimers: jest.advanceTimersByTime });
    render(
      <ToastProvider>
        <Undoer tone="failure" />
      </ToastProvider>,
    );
    await user.click(screen.getByText('Undo'));
    act(() => void jest.advanceTimersByTime(60_000));
    expect(screen.getByRole('status').textContent).toContain('Undid wall C');
    await user.click(screen.getByRole('button', { name: 'Close message' }));
    expect(screen.getByRole('status').textContent).toBe('');
    jest.useRealTimers();
  });
});

describe('ErrorBoundary', () => {
  it('says what happened and what is kept, and tries again', async () => {
    jest.spyOn(console, 'error').mockImplementation(() => undefined);
    let broken = true;
    function Screen() {
      if (broken) throw new Error('no plan');
      return <Text>Drawing</Text>;
    }
    const onError = jest.fn();
    render(
      <ErrorBoundary onError={onError}>
        <Screen />
      </ErrorBoundary>,
    );
    expect(screen.getByRole('alert').textContent).toContain('What you typed is kept on this device');
    expect(onError).toHaveBeenCalledWith(expect.objectContaining({ message: 'no plan' }));
    broken = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(screen.getByText('Drawing')).toBeTruthy();
  });
});
