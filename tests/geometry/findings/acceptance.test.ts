import { acceptanceOf, isOpen } from '@/geometry/findings/acceptance';
import type { Finding } from '@/geometry/findings/types';

const finding = (text: string, severity: Finding['severity'] = 'warn'): Finding => ({
  key: 'miter-opens joint 1-2',
  code: 'miter-opens',
  severity,
  text,
  action: 'Glue it in the shop.',
  at: { joint: ['1', '2'] },
  source: 'Wood Handbook Table 13-5',
});
const given = { reason: 'The owner knows.', by: 'Ilse', at: '2026-03-16T09:00:00.000Z' };

describe('acceptanceOf', () => {
  it('is accepted while the sentence stays as it was, and open again when its number changes', () => {
    const layout = { accepted: { 'miter-opens joint 1-2': { ...given, text: 'Opens 1/8 in.' } } };
    expect(acceptanceOf(layout, finding('Opens 1/8 in.'))).toMatchObject({ state: 'accepted' });
    expect(acceptanceOf(layout, finding('Opens 5/32 in.'))).toMatchObject({ state: 'changed since', accepted: given });
    expect(isOpen(layout, finding('Opens 5/32 in.'))).toBe(true);
    expect(isOpen(layout, finding('Opens 1/8 in.'))).toBe(false);
  });

  it('takes one kept without its sentence as it is', () => {
    expect(isOpen({ accepted: { 'miter-opens joint 1-2': given } }, finding('Opens 1/8 in.'))).toBe(false);
  });

  it('never accepts what must be fixed', () => {
    const layout = { accepted: { 'miter-opens joint 1-2': { ...given, text: 'Opens 1/8 in.' } } };
    expect(acceptanceOf(layout, finding('Opens 1/8 in.', 'stop'))).toEqual({ state: 'open' });
  });
});
