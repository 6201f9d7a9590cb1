import { act, fireEvent, render, screen } from '@testing-library/react';
import { Suspense, type ReactNode } from 'react';

import { latePart } from '@/components/shell/late-part';
import { OpeningJob } from '@/components/shell/OpeningJob';
import { ErrorBoundary } from '@/components/ui/ErrorBoundary';

interface Screens {
  readonly RoomScreen: () => string;
}

/** A network that answers when told to, and the loads it was asked for. */
function network() {
  const asked: { readonly give: () => void; readonly fail: () => void }[] = [];
  const load = () =>
    new Promise<Screens>((resolve, reject) => {
      asked.push({ give: () => resolve({ RoomScreen: () => 'Wall A' }), fail: () => reject(new Error('No signal')) });
    });
  const { fetchPart, usePart } = latePart(load);
  function Room() {
    const { RoomScreen } = usePart();
    return <RoomScreen />;
  }
  const page = (
    <ErrorBoundary>
      <Suspense fallback={<OpeningJob />}>
        <Room />
      </Suspense>
    </ErrorBoundary>
  );
  return { asked, fetchPart, page };
}

const wait = (milliseconds: number) => act(() => new Promise<void>((resolve) => setTimeout(resolve, milliseconds)));
/** React resumes what waited inside `act` only when the `act` itself was awaited. */
const shownFirst = (page: ReactNode) => act(async () => render(page));
const shown = () => document.body.textContent;

describe('a part of the app that comes late', () => {
  it('stands behind a notice until it is here, and comes at once the next time', async () => {
    const { asked, page } = network();
    const { unmount } = await shownFirst(page);
    expect(screen.getByRole('status').textContent).toBe('Opening the job');
    await act(async () => asked[0]!.give());
    expect(shown()).toBe('Wall A');

    unmount();
    await shownFirst(page);
    expect(shown()).toBe('Wall A');
    expect(asked).toHaveLength(1);
  });

  it('is loaded once where the list asks for it before a job is opened', async () => {
    const { asked, fetchPart, page } = network();
    const early = fetchPart();
    await shownFirst(page);
    await act(async () => asked[0]!.give());
    expect(shown()).toBe('Wall A');
    expect((await early).RoomScreen()).toBe('Wall A');
    expect(asked).toHaveLength(1);
  });

  it('says that it did not come, and is asked for again only when somebody wants it', async () => {
    // React writes what the boundary caught to the console as well.
    const written = jest.spyOn(console, 'error').mockImplementation(() => undefined);
    const { asked, page } = network();
    await shownFirst(page);
    await act(async () => asked[0]!.fail());
    expect(screen.getByText('This screen stopped working')).toBeTruthy();
    await wait(600);
    expect(asked).toHaveLength(1);

    await act(async () => fireEvent.click(screen.getByRole('button', { name: 'Try again' })));
    await act(async () => asked[1]!.give());
    expect(shown()).toBe('Wall A');
    written.mockRestore();
  });
});
