import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';

import { bladeTicks } from '@/components/measure/blade-ticks';
import { CornerBadge, cornerWord } from '@/components/measure/CornerBadge';
import { Fraction } from '@/components/measure/Fraction';
import { TapeBlade } from '@/components/measure/TapeBlade';

describe('Fraction', () => {
  it('is heard in words and seen as a stack', () => {
    const { container } = render(<Fraction inches={96.25} />);
    expect(screen.getByText('96 and 1 quarter inches')).toBeTruthy();
    const seen = container.querySelector('[aria-hidden=true]')!;
    expect(seen.textContent).toBe('9614in');
  });

  it('shows feet, millimeters, and no fraction where there is none', () => {
    const shown = (inches: number, props: object) =>
      render(<Fraction inches={inches} {...props} />).container.querySelector('[aria-hidden=true]')!.textContent;
    expect(shown(100.1875, { feet: true })).toBe('8ft4316in');
    expect(shown(84, {})).toBe('84in');
    expect(shown(0.1875, {})).toBe('316in');
    expect(shown(100, { step: '1 mm' })).toBe('2540mm');
    expect(shown(-0.25, {})).toBe('−14in');
  });

  it('stacks at 0.66 of the whole number and never under 11 px', () => {
    const sizes = (size: number) => {
      const { container } = render(<Fraction inches={96.25} size={size} unit={false} />);
      const digits = Array.from(container.querySelectorAll('[aria-hidden=true] div[dir=auto]'));
      return digits.map((one) => parseFloat(getComputedStyle(one).fontSize));
    };
    expect(sizes(30)).toEqual([30, 19.8, 19.8]);
    expect(sizes(14)).toEqual([14, 11, 11]);
  });
});

describe('TapeBlade', () => {
  it('is a button named by whose length it is', async () => {
    const onPress = jest.fn();
    render(<TapeBlade name="Wall B" inches={118.625} state="twice" onPress={onPress} />);
    await userEvent.click(screen.getByRole('button', { name: 'Wall B, 118 and 5 eighths inches, taped twice' }));
    expect(onPress).toHaveBeenCalledTimes(1);
  });

  it('says re-take and not taped in words', () => {
    render(<TapeBlade name="Wall C" inches={84.75} state="retake" onPress={() => undefined} />);
    render(<TapeBlade name="Wall D" inches={null} onPress={() => undefined} />);
    expect(screen.getByRole('button', { name: 'Wall C, 84 and 3 quarters inches, re-take' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Wall D, not taped' }).textContent).toBe('tap to type');
  });

  it('repeats every 80 px: 16 ticks 5 px apart, the inch longest', () => {
    const sizes = bladeTicks(44, '#000').backgroundSize.split(', ');
    expect(sizes).toEqual(['5px 4.0px', '10px 5.5px', '20px 7.0px', '40px 9.0px', '80px 13.0px']);
  });
});

describe('CornerBadge', () => {
  it('says open, tight or square, square within 0.1 of a degree', () => {
    expect(cornerWord(90.9, 90)).toBe('open 0.9');
    expect(cornerWord(88.7, 90)).toBe('tight 1.3');
    expect(cornerWord(90.1, 90)).toBe('square');
    expect(cornerWord(89.84, 90)).toBe('tight 0.2');
    expect(cornerWord(135.04, 135)).toBe('true');
  });

  it('is heard as a sentence', () => {
    render(<CornerBadge corner="A-B" angleDeg={90.93} />);
    render(<CornerBadge corner="B-C" angleDeg={null} onPress={() => undefined} />);
    render(<CornerBadge corner="C-D" angleDeg={84.2} retake />);
    expect(screen.getByRole('img', { name: 'Corner A-B, 90.9 degrees, open 0.9' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Corner B-C, not checked' })).toBeTruthy();
    expect(screen.getByRole('img', { name: 'Corner C-D, 84.2 degrees, re-take' })).toBeTruthy();
  });
});
