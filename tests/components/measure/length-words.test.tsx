import { render, screen } from '@testing-library/react';

import { LengthWords, partLengths } from '@/components/measure/LengthWords';
import { Text } from '@/components/ui/Text';

describe('lengths in a sentence', () => {
  it('are parted from the words around them', () => {
    expect(partLengths('Wall B bows in 5/16 in; scribing leaves 24 11/16 in at 62 in.')).toEqual([
      'Wall B bows in ',
      { inches: 0.3125, step: '1/16' },
      '; scribing leaves ',
      { inches: 24.6875, step: '1/16' },
      ' at 62 in.',
    ]);
  });

  it('keep the step they were written with, and leave dates, ratios and whole inches alone', () => {
    expect(partLengths('1/2 in')).toEqual([{ inches: 0.5, step: '1/8' }]);
    expect(partLengths('3/32 in')).toEqual([{ inches: 0.09375, step: '1/32' }]);
    expect(partLengths('one of 1/3, 2 in and 1/2 inch')).toEqual(['one of 1/3, 2 in and 1/2 inch']);
    expect(partLengths('')).toEqual([]);
  });

  it('are read out in words', () => {
    render(<Text><LengthWords text="Over 1/8 in." size={16} /></Text>); // prettier-ignore
    expect(screen.getByText('1 eighth of an inch')).toBeTruthy();
  });
});
