import { act, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { FractionPad, type FractionPadProps } from '@/components/measure/FractionPad';

function openPad(props: Partial<FractionPadProps> = {}) {
  const onNext = jest.fn();
  const onCancel = jest.fn();
  const next = { label: 'Wall C', icon: 'next' } as const;
  render(
    <FractionPad title="Wall B" hint="corner to corner" next={next} onNext={onNext} onCancel={onCancel} {...props} />,
  );
  return { onNext, onCancel, user: userEvent.setup() };
}

const key = (name: string | RegExp) => screen.getByRole('button', { name });

beforeEach(() => window.localStorage.clear());

describe('FractionPad', () => {
  it('gives 100 3/16 for 8 ft 4 3/16 pressed with a finger', async () => {
    const { onNext, user } = openPad();
    for (const name of ['8', 'feet', '4', '3 sixteenths of an inch', 'Next: Wall C']) await user.click(key(name));
    expect(onNext).toHaveBeenCalledWith({ text: `8' 4 3/16"`, value: 100.1875 });
  });

  it('gives the same typed on a keyboard, with Enter for Next', async () => {
    const { onNext, user } = openPad();
    await user.keyboard(`8' 4 3/16"{Enter}`);
    expect(onNext).toHaveBeenCalledWith({ text: `8' 4 3/16"`, value: 100.1875 });
  });

  it('reads the length out as it grows', async () => {
    const { user } = openPad();
    await user.keyboard(`118`);
    await user.click(key('5 eighths of an inch'));
    expect(screen.getByText('118 and 5 eighths inches')).toBeTruthy();
  });

  it('marks the lit fraction as pressed and clears it on a second press', async () => {
    const { user } = openPad();
    await user.keyboard('96');
    await user.click(key('1 quarter of an inch'));
    expect(key('1 quarter of an inch').getAttribute('aria-pressed')).toBe('true');
    await user.click(key('1 quarter of an inch'));
    expect(key('1 quarter of an inch').getAttribute('aria-pressed')).toBe('false');
  });

  it('keeps what was typed and says why Next cannot go on', async () => {
    const { onNext, user } = openPad();
    await user.keyboard('{Enter}');
    expect(screen.getByText('Nothing is typed here. Type the length first.')).toBeTruthy();
    await user.keyboard(`8' 14{Enter}`);
    expect(screen.getByText(/12 or more inches behind the feet/)).toBeTruthy();
    expect(onNext).not.toHaveBeenCalled();
    await user.keyboard('{Backspace}{Enter}');
    expect(onNext).toHaveBeenCalledWith({ text: `8' 1"`, value: 97 });
  });

  it('asks the screen before it goes on', async () => {
    const check = (inches: number) => (inches > 100 ? 'Wall B is 96 in on the sketch. Tape it again.' : null);
    const { onNext, user } = openPad({ check });
    await user.keyboard('120{Enter}');
    expect(screen.getByText('Wall B is 96 in on the sketch. Tape it again.')).toBeTruthy();
    expect(onNext).not.toHaveBeenCalled();
  });

  it('remembers millimeters for the person', async () => {
    const first = openPad();
    await first.user.click(key('millimeters'));
    await first.user.keyboard('2545{Enter}');
    expect(first.onNext).toHaveBeenCalledWith({ text: '2545 mm', value: 2545 / 25.4 });
    expect(screen.queryByRole('group', { name: 'One inch of tape' })).toBeNull();
    const second = openPad({ title: 'Wall C' });
    await second.user.keyboard('84{Enter}');
    expect(second.onNext).toHaveBeenCalledWith({ text: '84 mm', value: 84 / 25.4 });
  });

  it('starts from a length already taped, or from the key that opened it', async () => {
    const { onNext, user } = openPad({ start: '118 5/8' });
    await user.keyboard('{Enter}');
    expect(onNext).toHaveBeenCalledWith({ text: '118 5/8', value: 118.625 });
    const opened = openPad({ title: 'Wall C', firstKey: '9' });
    await opened.user.keyboard('6{Enter}');
    expect(opened.onNext).toHaveBeenCalledWith({ text: '96', value: 96 });
  });

  it('is called off by Escape', async () => {
    const { onCancel, user } = openPad();
    await user.keyboard('9{Escape}');
    expect(onCancel).toHaveBeenCalledTimes(1);
  });

  it('presses a key that was reached by Tab, instead of going on', async () => {
    const { onNext, user } = openPad();
    act(() => key('7').focus());
    await user.keyboard('{Enter}');
    expect(onNext).not.toHaveBeenCalled();
    expect(screen.getByText('7 inches')).toBeTruthy();
  });

  it('puts the function keys at the left for a left hand', () => {
    window.localStorage.setItem('offsquare.setting.anyone.pad-left', 'on');
    openPad();
    const row = key('Take back').parentElement!;
    expect(getComputedStyle(row).flexDirection).toBe('row-reverse');
  });
});
