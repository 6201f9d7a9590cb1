import { Fragment } from 'react';

import type { DisplayStep } from '@/geometry/tape/format-length';
import type { ColorName } from '../ui/tokens';
import { Fraction } from './Fraction';

export interface LengthWordsProps {
  /** A sentence with lengths written as on a tape: "Wall B bows in 5/16 in." */
  readonly text: string;
  /** px of the words it stands among. */
  readonly size: number;
  readonly tone?: ColorName;
  readonly bold?: boolean;
}

/** A part of a sentence, or a length in it. */
export type WordsOrLength = string | { readonly inches: number; readonly step: DisplayStep };

const LENGTH = /(?:(\d+) )?(\d+)\/(2|4|8|16|32|64) in\b/g;

/** Parts a sentence at the lengths that have a fraction; whole inches stay words. */
export function partLengths(text: string): WordsOrLength[] {
  const parts: WordsOrLength[] = [];
  let done = 0;
  for (const found of text.matchAll(LENGTH)) {
    if (found.index > done) parts.push(text.slice(done, found.index));
    const [all, whole = '0', over, under] = found;
    const step: DisplayStep = Number(under) < 8 ? '1/8' : (`1/${under}` as DisplayStep);
    parts.push({ inches: Number(whole) + Number(over) / Number(under), step });
    done = found.index + all.length;
  }
  return done < text.length ? [...parts, text.slice(done)] : parts;
}

/** A sentence with its fractions stacked, to stand inside Text. A screen reader hears each length in words. */
export function LengthWords({ text, size, ...look }: LengthWordsProps) {
  return partLengths(text).map((part, i) => (
    <Fragment key={i}>
      {typeof part === 'string' ? part : <Fraction inches={part.inches} step={part.step} size={size} {...look} />}
    </Fragment>
  ));
}
