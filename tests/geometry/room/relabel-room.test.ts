import { relabelRoom } from '@/geometry/room/relabel-room';
import type { RoomInput } from '@/geometry/room/types';
import { fitted, refused, roomInput, WORKED_EXAMPLE } from '@/tests/builders/room-input';

/** The worked example under ids that nobody would say aloud. */
const IDS = { A: 'w-7f', B: 'w-02', C: 'w-c1' };
const LABELS = { 'w-7f': 'A', 'w-02': 'B', 'w-c1': 'C' };

const hidden: RoomInput = {
  ...relabelRoom({ ...WORKED_EXAMPLE, trust: ['wall A', 'corner A-B'] }, IDS),
  labels: LABELS,
};

describe('a room whose walls have labels', () => {
  it('is the same room under other ids, trust and ignore included', () => {
    expect(hidden.trust).toEqual(['wall w-7f', 'corner w-7f-w-02']);
    expect(hidden.ties[0]!.to).toEqual({ wall: 'w-c1', at: 'end' });
    const fit = fitted(hidden);
    expect(fit.points).toEqual(fitted(WORKED_EXAMPLE).points);
    expect(fit.walls.map((w) => w.id)).toEqual(['w-7f', 'w-02', 'w-c1']);
  });

  it('keeps ids in what programs read and labels in what people read', () => {
    const { next } = fitted(hidden, { next: true });
    expect(next).toMatchObject({ kind: 'tie', from: { wall: 'w-7f', at: 'end' }, to: { wall: 'w-c1', at: 'end' } });
    expect(next!.why).toMatch(/^Tape from corner A-B to the right end of wall C\. Corner B-C is the loosest/);
  });

  it('names the wall at fault by its label, and its place as before', () => {
    const walls = hidden.walls.map((w, i) => (i === 1 ? { ...w, lengths: [] } : w));
    expect(refused({ ...hidden, walls, ties: [] })).toEqual({
      code: 'undetermined',
      message: 'Nothing fixes the length of wall B. Tape it, or a tie that reaches it.',
      path: 'walls[1].length',
    });
  });

  it('goes by ids without labels, and for walls that have none', () => {
    const walls = [
      { id: 'x1', lengths: [0] },
      { id: 'x2', lengths: [96] },
    ];
    expect(refused(roomInput({ walls })).message).toBe('Wall x1 reads 0. A wall has a length.');
    expect(refused(roomInput({ walls, labels: { x2: 'B' } })).message).toBe('Wall x1 reads 0. A wall has a length.');
    expect(refused(roomInput({ walls, labels: { x1: 'A', x2: 'B' } })).message).toBe(
      'Wall A reads 0. A wall has a length.',
    );
  });
});
