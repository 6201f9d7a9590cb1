import { act, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';

import { Button } from '@/components/ui/Button';
import { Field } from '@/components/ui/Field';
import { FindingRow } from '@/components/ui/FindingRow';
import { STAGES, StageChip } from '@/components/ui/StageChip';
import { StageRuler } from '@/components/ui/StageRuler';
import { EmptyState, ErrorState, LoadingState, NoPermissionState, OfflineState } from '@/components/ui/StateCard';
import { Table } from '@/components/ui/Table';
import { rowForKey } from '@/components/ui/table-keys';
import { Text } from '@/components/ui/Text';

const JOBS = ['Scullery', 'Galley', 'Island'].map((name, index) => ({ id: String(index), name }));

function Jobs({ onOpen, onMore }: { readonly onOpen: (name: string) => void; readonly onMore?: () => void }) {
  const [selected, setSelected] = useState<string | null>(null);
  return (
    <>
      <Field label="Find" value="" onChange={() => undefined} />
      <Table
        label="Jobs"
        main
        rows={JOBS}
        rowKey={(job) => job.id}
        rowLabel={(job) => `${job.name}, Drawn`}
        selected={selected}
        onSelect={setSelected}
        onOpen={(job) => onOpen(job.name)}
        columns={[
          { key: 'name', title: 'Job', cell: (job) => <Text>{job.name}</Text> },
          {
            key: 'more',
            title: 'Act',
            titleHidden: true,
            width: 60,
            cell: () => <Button label="More" onPress={onMore} />,
          },
        ]}
      />
    </>
  );
}

const rows = () => screen.getAllByRole('row').slice(1);
const selectedRow = () => rows().findIndex((row) => row.getAttribute('aria-selected') === 'true');

beforeEach(() => window.localStorage.clear());

describe('Table', () => {
  it('has a head, and rows that say what they are', () => {
    render(<Jobs onOpen={() => undefined} />);
    const table = screen.getByRole('table', { name: 'Jobs' });
    expect(within(table).getAllByRole('columnheader')).toHaveLength(2);
    expect(rows().map((row) => row.getAttribute('aria-label'))).toEqual([
      'Scullery, Drawn',
      'Galley, Drawn',
      'Island, Drawn',
    ]);
  });

  it('walks with J and K from anywhere, stops at the ends, and Enter opens', async () => {
    const onOpen = jest.fn();
    render(<Jobs onOpen={onOpen} />);
    await userEvent.keyboard('jj');
    expect(selectedRow()).toBe(1);
    await userEvent.keyboard('jjj');
    expect(selectedRow()).toBe(2);
    await userEvent.keyboard('k{Enter}');
    expect(onOpen.mock.calls).toEqual([['Galley']]);
  });

  it('lets J be typed into a field, and be turned off', async () => {
    const { unmount } = render(<Jobs onOpen={() => undefined} />);
    await userEvent.type(screen.getByRole('textbox', { name: 'Find' }), 'j');
    expect(selectedRow()).toBe(-1);
    unmount();
    window.localStorage.setItem('offsquare.setting.anyone.single-keys', 'off');
    render(<Jobs onOpen={() => undefined} />);
    await userEvent.keyboard('j');
    expect(selectedRow()).toBe(-1);
    await userEvent.tab();
    await userEvent.tab();
    await userEvent.keyboard('{ArrowDown}');
    expect(selectedRow()).toBe(1);
  });

  it('opens by a click, but not by a click on a button in the row', async () => {
    const onOpen = jest.fn();
    const onMore = jest.fn();
    render(<Jobs onOpen={onOpen} onMore={onMore} />);
    await userEvent.click(within(rows()[2]!).getByRole('button', { name: 'More' }));
    expect([onOpen.mock.calls.length, onMore.mock.calls.length]).toEqual([0, 1]);
    await userEvent.click(screen.getByText('Island'));
    expect(onOpen.mock.calls).toEqual([['Island']]);
  });

  it('is reached by one Tab: the selected row, or the first', async () => {
    render(<Jobs onOpen={() => undefined} />);
    expect(rows().map((row) => row.tabIndex)).toEqual([0, -1, -1]);
    await userEvent.keyboard('jj');
    expect(rows().map((row) => row.tabIndex)).toEqual([-1, 0, -1]);
  });
});

describe('rowForKey', () => {
  it('gives no row for an empty list or another key', () => {
    expect(rowForKey('j', -1, 0, true)).toBeNull();
    expect(rowForKey('x', 1, 3, true)).toBeNull();
    expect([rowForKey('Home', 2, 3, false), rowForKey('End', 0, 3, false)]).toEqual([0, 2]);
  });
});

describe('FindingRow', () => {
  it('says its weight in a word, its pieces and its fact in one button', async () => {
    const onPress = jest.fn();
    render(
      <FindingRow
        severity="stop"
        fact="Corner A-B has no access from below."
        act="Set bolts first."
        pieces={['Q', 'R']}
        onPress={onPress}
      />,
    );
    await userEvent.click(
      screen.getByRole('button', { name: /Must fix Q R Corner A-B has no access from below\.\s?Set bolts first\./ }),
    );
    expect(onPress).toHaveBeenCalledTimes(1);
  });

  it('keeps an accepted one listed with who and why', () => {
    render(
      <FindingRow severity="warn" fact="Q is narrow." accepted={{ by: 'Sol', reason: 'One screw line holds.' }} />,
    );
    expect(screen.getByText('Look at, accepted')).toBeTruthy();
    expect(screen.getByText('Sol: One screw line holds.')).toBeTruthy();
  });
});

describe('StageChip', () => {
  it('fills as many of five bars as stages are behind it', () => {
    const looks = STAGES.map((stage) => {
      const { container } = render(<StageChip stage={stage} />);
      return Array.from(container.querySelectorAll('[aria-hidden=true] > div')).map((bar) => bar.className);
    });
    const empty = looks[0]!;
    const filled = looks.map((bars) => bars.filter((bar, index) => bar !== empty[index]).length);
    expect(empty).toHaveLength(5);
    expect(filled).toEqual([0, 1, 2, 3, 4, 5]);
  });
});

describe('StageRuler', () => {
  it('narrows to a stage and back', async () => {
    const onChoose = jest.fn();
    const { rerender } = render(<StageRuler counts={{ Measured: 3 }} onChoose={onChoose} />);
    await userEvent.click(screen.getByRole('button', { name: '3 Measured' }));
    rerender(<StageRuler counts={{ Measured: 3 }} chosen="Measured" onChoose={onChoose} />);
    await userEvent.click(screen.getByRole('button', { name: '3 Measured' }));
    expect(onChoose.mock.calls).toEqual([['Measured'], [null]]);
    expect(screen.getByRole('button', { name: '0 Cut' })).toBeTruthy();
  });
});

describe('the state cards', () => {
  it('speak up as they should: an error at once, work and no signal when there is time', () => {
    render(<ErrorState title="No slab is wide enough" body="T is 27 deep and the widest hard maple is 25." />);
    render(<LoadingState title="Trying plans" done={0.46} body="12 of 26 tried." />);
    render(<OfflineState body="3 to send." />);
    expect(screen.getByRole('alert').textContent).toContain('No slab is wide enough');
    expect(screen.getAllByRole('status')).toHaveLength(2);
    expect(screen.getByRole('progressbar', { name: 'Trying plans' }).getAttribute('aria-valuenow')).toBe('46');
  });

  it('give no value for work of unknown length, and head every card', () => {
    render(<LoadingState title="Reading the file" />);
    render(<EmptyState icon="room" title="No walls yet" />);
    render(<NoPermissionState body="The owner sees prices." />);
    expect(screen.getByRole('progressbar').getAttribute('aria-valuenow')).toBeNull();
    const heads = screen.getAllByRole('heading', { level: 2 }).map((head) => head.textContent);
    expect(heads).toEqual(['Reading the file', 'No walls yet', 'Not yours to open']);
  });
});

it('focuses a row only once it is walked to', () => {
  render(<Jobs onOpen={() => undefined} />);
  expect(document.activeElement).toBe(document.body);
  act(() => rows()[0]!.focus());
  expect(document.activeElement).toBe(rows()[0]);
});
