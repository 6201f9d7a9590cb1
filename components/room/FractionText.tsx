import { Fraction } from '../measure/Fraction';
import { Text, type TextProps } from '../ui/Text';
import type { ColorName } from '../ui/tokens';

export interface FractionTextProps extends Omit<TextProps, 'children' | 'tone'> {
  readonly children: string;
  readonly tone?: ColorName;
  /** px of the numbers. */
  readonly number: number;
  readonly bold?: boolean;
}

const LENGTH = /(?:(\d+) )?(\d+)\/(\d+) in/g;

/** A sentence in which lengths such as `3/4 in` are set as stacked fractions. */
export function FractionText({ children, tone, number, bold, ...text }: FractionTextProps) {
  const parts: React.ReactNode[] = [];
  let from = 0;
  for (const match of children.matchAll(LENGTH)) {
    const inches = Number(match[1] ?? 0) + Number(match[2]) / Number(match[3]);
    parts.push(children.slice(from, match.index));
    parts.push(<Fraction key={match.index} inches={inches} step="1/64" size={number} tone={tone} bold={bold} />);
    from = match.index + match[0].length;
  }
  parts.push(children.slice(from));
  return (
    <Text {...text} tone={tone}>
      {parts}
    </Text>
  );
}
