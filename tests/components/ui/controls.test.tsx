import { act, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';

import { Button } from '@/components/ui/Button';
import { Checkbox } from '@/components/ui/Checkbox';
import { Field } from '@/components/ui/Field';
import { Icon } from '@/components/ui/Icon';
import { IconButton } from '@/components/ui/IconButton';
import { iconShapes, type IconName } from '@/components/ui/icon-shapes';
import { MoreMenu } from '@/components/ui/Menu';
import { placeMenu } from '@/components/ui/place-menu';
import { RadioCards } from '@/components/ui/RadioCard';
import { Chips, Segmented } from '@/components/ui/Segmented';
import { DateField, Select } from '@/components/ui/Select';
import { Tabs } from '@/components/ui/Tabs';

const button = (name: string) => screen.getByRole('button', { name });

describe('Button', () => {
  it('is pressed by mouse and by Enter, and not while it is busy or off', async () => {
    const onPress = jest.fn();
    const { rerender } = render(<Button label="Tape wall A" look="primary" icon="tape" onPress={onPress} />);
    await userEvent.click(button('Tape wall A'));
    await userEvent.keyboard('{Enter}');
    expect(onPress).toHaveBeenCalledTimes(2);
    const insistent = userEvent.setup({ pointerEventsCheck: 0 });
    rerender(<Button label="Tape wall A" busy onPress={onPress} />);
    expect(button('Tape wall A').getAttribute('aria-busy')).toBe('true');
    await insistent.click(button('Tape wall A'));
    rerender(<Button label="Tape wall A" disabled describedBy="why" onPress={onPress} />);
    await insistent.click(button('Tape wall A'));
    expect(button('Tape wall A').getAttribute('aria-describedby')).toBe('why');
    expect(onPress).toHaveBeenCalledTimes(2);
  });

  it('is never under 44 px high, whatever is asked', () => {
    render(<Button label="Small" height={20} />);
    render(<Button label="At the saw" height={84} />);
    expect(getComputedStyle(button('Small')).minHeight).toBe('44px');
    expect(getComputedStyle(button('At the saw')).minHeight).toBe('84px');
  });

  it('is a link with an address when it has one, and leaves going there to the router', async () => {
    const onPress = jest.fn();
    render(<Button label="Open job" href="/jobs/1" onPress={onPress} />);
    const link = screen.getByRole('link', { name: 'Open job' });
    expect(link.getAttribute('href')).toBe('/jobs/1');
    await userEvent.click(link);
    expect(onPress).toHaveBeenCalledTimes(1);
  });
});

describe('IconButton', () => {
  it('is 48 by 48 and has a name', () => {
    render(<IconButton icon="undo" label="Undo" />);
    const { width, height } = getComputedStyle(button('Undo'));
    expect([width, height]).toEqual(['48px', '48px']);
  });
});

describe('Icon', () => {
  it.each(Object.keys(iconShapes) as IconName[])('draws %s on the grid of 24, hidden from screen readers', (name) => {
    const { container } = render(<Icon name={name} />);
    const svg = container.querySelector('svg')!;
    expect(svg.getAttribute('viewBox')).toBe('0 0 24 24');
    expect(svg.getAttribute('aria-hidden')).toBe('true');
    const paths = Array.from(svg.querySelectorAll('path'));
    expect(paths.length).toBeGreaterThan(0);
    for (const path of paths) expect(path.getAttribute('d')).toMatch(/^M[-\d. A-Za-z]+$/);
  });
});

describe('Field', () => {
  it('ties the error sentence and the hint to the field and keeps what was typed', async () => {
    function Weight() {
      const [value, setValue] = useState('');
      const error = Number(value) > 40 ? 'Type 40 or less.' : undefined;
      return <Field label="Weight" hint="Dry weight." value={value} onChange={setValue} error={error} />;
    }
    render(<Weight />);
    const field = screen.getByRole('textbox', { name: 'Weight' }) as HTMLInputElement;
    const described = () =>
      field
        .getAttribute('aria-describedby')!
        .split(' ')
        .map((id) => document.getElementById(id)!.textContent);
    expect(described()).toEqual(['Dry weight.']);
    await userEvent.type(field, '44');
    expect(described()).toEqual(['Type 40 or less.', 'Dry weight.']);
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect(field.value).toBe('44');
  });

  it('hands Enter on, and asks phones for the right keys', async () => {
    const onSubmit = jest.fn();
    render(<Field label="Work email" kind="email" value="" onChange={() => undefined} onSubmit={onSubmit} />);
    const field = screen.getByRole('textbox', { name: 'Work email' });
    await userEvent.type(field, '{Enter}');
    expect(onSubmit).toHaveBeenCalledTimes(1);
    expect(field.getAttribute('inputmode')).toBe('email');
  });
});

describe('Select and DateField', () => {
  it('chooses by the device’s own list', async () => {
    const onChange = jest.fn();
    const options = [
      { value: 'full', label: 'Full length' },
      { value: 'short', label: 'Short staves' },
    ] as const;
    render(<Select label="Staves" options={options} value={null} onChange={onChange} error="Choose one." />);
    const list = screen.getByRole('combobox', { name: 'Staves' });
    expect(list.getAttribute('aria-invalid')).toBe('true');
    await userEvent.selectOptions(list, 'short');
    expect(onChange).toHaveBeenCalledWith('short');
  });

  it('takes a day', async () => {
    const onChange = jest.fn();
    render(<DateField label="Fit on" value="" onChange={onChange} />);
    await userEvent.type(screen.getByLabelText('Fit on'), '2026-03-18');
    expect(onChange).toHaveBeenCalledWith('2026-03-18');
  });
});

describe('Checkbox', () => {
  it('is ticked by a click anywhere on it and by the space bar', async () => {
    const onChange = jest.fn();
    render(<Checkbox label="Both faces good" checked={false} onChange={onChange} />);
    const box = screen.getByRole('checkbox', { name: 'Both faces good' });
    await userEvent.click(box);
    act(() => box.focus());
    await userEvent.keyboard(' ');
    expect(onChange.mock.calls).toEqual([[true], [true]]);
    expect(box.getAttribute('aria-checked')).toBe('false');
  });
});

describe('choosing one of a few', () => {
  const options = [
    { value: 'a', label: 'Both good' },
    { value: 'b', label: 'One good', disabled: true },
    { value: 'c', label: 'None' },
  ] as const;

  it('moves with the arrows, skips what is off, and Tab reaches only the chosen one', async () => {
    const onChange = jest.fn();
    render(<Segmented label="Faces" options={options} value="a" onChange={onChange} />);
    await userEvent.tab();
    expect(document.activeElement?.textContent).toBe('Both good');
    await userEvent.keyboard('{ArrowRight}');
    expect(onChange).toHaveBeenLastCalledWith('c');
    await userEvent.keyboard('{End}{Home}');
    expect(onChange.mock.calls).toEqual([['c'], ['c'], ['a']]);
    await userEvent.tab();
    expect(document.activeElement).toBe(document.body);
  });

  it('tells screen readers which one is on', () => {
    render(<Chips label="Show" options={options} value="c" onChange={() => undefined} />);
    const on = screen.getAllByRole('radio').map((one) => one.getAttribute('aria-checked'));
    expect(on).toEqual(['false', 'false', 'true']);
  });

  it('names a card by its title and what it costs', async () => {
    const onChange = jest.fn();
    const cards = [
      { value: 'turn', title: 'Turn two', spoken: '$1,101, in use' },
      { value: 'one', title: 'B in one piece', spoken: 'will not go in', disabled: true },
    ] as const;
    render(<RadioCards label="Plan" options={cards} value={null} onChange={onChange} />);
    const insistent = userEvent.setup({ pointerEventsCheck: 0 });
    await insistent.click(screen.getByRole('radio', { name: 'B in one piece, will not go in' }));
    expect(onChange).not.toHaveBeenCalled();
    await userEvent.click(screen.getByRole('radio', { name: 'Turn two, $1,101, in use' }));
    expect(onChange).toHaveBeenCalledWith('turn');
  });

  it('walks tabs the same way', async () => {
    const onChange = jest.fn();
    const tabs = [
      { value: 'findings', label: 'Findings', count: 5 },
      { value: 'pieces', label: 'Pieces' },
    ] as const;
    render(<Tabs label="Inspector" tabs={tabs} value="findings" onChange={onChange} />);
    expect(screen.getByRole('tab', { name: 'Findings 5' }).getAttribute('aria-selected')).toBe('true');
    await userEvent.tab();
    await userEvent.keyboard('{ArrowLeft}');
    expect(onChange).toHaveBeenCalledWith('pieces');
  });
});

describe('placeMenu', () => {
  const menu = { width: 200, height: 150 };
  const window = { width: 390, height: 844 };
  const button = (left: number, top: number) => ({ left, top, right: left + 48, bottom: top + 48 });

  it('hangs under its button with the right sides in line', () => {
    expect(placeMenu(button(330, 8), menu, window)).toEqual({ left: 178, top: 56 });
  });

  it('lines up the left sides in the left half', () => {
    expect(placeMenu(button(60, 8), menu, window)).toEqual({ left: 60, top: 56 });
  });

  it('goes above where there is no room below, and stays 8 px inside the window', () => {
    expect(placeMenu(button(330, 780), menu, window)).toEqual({ left: 178, top: 630 });
    expect(placeMenu(button(0, 8), menu, window)).toEqual({ left: 8, top: 56 });
    expect(placeMenu(button(330, 50), { width: 200, height: 900 }, window)).toEqual({ left: 178, top: 8 });
  });
});

describe('MoreMenu', () => {
  it('opens, walks with arrows, and gives the focus back', async () => {
    const retake = jest.fn();
    const remove = jest.fn();
    const items = [
      { key: 'r', label: 'Re-take', onPress: retake },
      { key: 'n', label: 'Add note', disabled: true, onPress: () => undefined },
      { key: 'd', label: 'Delete', danger: true, onPress: remove },
    ];
    render(<MoreMenu label="More for wall B" items={items} />);
    await userEvent.click(button('More for wall B'));
    expect(document.activeElement?.textContent).toBe('Re-take');
    await userEvent.keyboard('{ArrowDown}');
    expect(document.activeElement?.textContent).toBe('Delete');
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByRole('menu')).toBeNull();
    expect(document.activeElement).toBe(button('More for wall B'));
    await userEvent.click(button('More for wall B'));
    await userEvent.click(screen.getByRole('menuitem', { name: 'Delete' }));
    expect([retake.mock.calls.length, remove.mock.calls.length]).toEqual([0, 1]);
  });
});
