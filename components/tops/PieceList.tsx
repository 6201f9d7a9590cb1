import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { Fraction } from '../measure/Fraction';
import { PieceLetter } from '../ui/PieceLetter';
import { Press } from '../ui/Press';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { spokenLength } from '@/geometry/tape/format-length';

/** Every piece with the edges a tape checks: back and front. */
export function PieceList({ onSelect }: { readonly onSelect: (letter: string) => void }) {
  const { plan, layout } = useOpenJob();
  const say = (inches: number) => spokenLength(inches, layout.step);
  return (
    <View role="list" aria-label="Pieces">
      {plan.pieces.map((piece) => (
        <View key={piece.key} role="listitem">
          <Press
            style={styles.row}
            hoverGround={color.chalkT}
            aria-label={`Piece ${piece.letter}, back ${say(piece.back)}, front ${say(piece.front)}, ${Math.round(piece.weight)} pounds`}
            onPress={() => onSelect(piece.letter)}
          >
            <PieceLetter letter={piece.letter} />
            <View style={styles.sizes}>
              <Text kind="small" hidden>
                back
              </Text>
              <Fraction inches={piece.back} step={layout.step} bold silent />
              <Text kind="small" hidden>
                front
              </Text>
              <Fraction inches={piece.front} step={layout.step} bold silent />
            </View>
            <Text kind="small" hidden>
              {`${Math.round(piece.weight)} lb`}
            </Text>
          </Press>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.m,
    minHeight: 56,
    borderBottomWidth: 1,
    borderBottomColor: color.line,
  },
  sizes: { flex: 1, flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space.s },
});
