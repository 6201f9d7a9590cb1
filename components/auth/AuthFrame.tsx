import type { ReactNode } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';

import { Logo } from '../ui/Logo';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { webStyle } from '../ui/web-style';

/** What everybody sees before they are in: a slab cut off square by a chalk line, the name, and a form. */
export function AuthFrame({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  const wide = useWide();
  return (
    <ScrollView style={styles.page} contentContainerStyle={[styles.grow, wide && styles.row]}>
      <View style={[styles.wood, staves, wide ? styles.woodWide : styles.woodPhone]} aria-hidden>
        <View style={styles.mark}>
          <Logo size={wide ? 96 : 72} />
        </View>
        <View style={wide ? chalkWide : chalkPhone} />
      </View>
      <View style={[styles.column, wide && styles.columnWide]} role="main">
        <Text kind="wordmark" tone="ink">
          Offsquare
        </Text>
        <Text kind="body" tone="ink2">
          Tops for rooms that aren’t square.
        </Text>
        <View style={styles.form}>
          <Text kind="sheetTitle" level={1}>
            {title}
          </Text>
          {children}
        </View>
      </View>
    </ScrollView>
  );
}

/** Hard maple, its staves lying a little off the page's own square. */
const staves = webStyle({
  backgroundColor: '#EBD5AB',
  backgroundImage: [
    'repeating-linear-gradient(176deg, transparent 0 13px, rgba(188,154,98,.85) 13px 14px)',
    'repeating-linear-gradient(176deg, rgba(188,154,98,.28) 0 14px, transparent 14px 28px, rgba(188,154,98,.14) 28px 42px, transparent 42px 70px)',
  ].join(', '),
});

const chalk = 'repeating-linear-gradient(90deg, rgba(255,255,255,.75) 0 2px, transparent 2px 10px)';
const chalkPhone = webStyle({
  position: 'absolute',
  left: '-5%',
  right: '-5%',
  bottom: -66,
  height: 90,
  backgroundColor: 'var(--paper)',
  borderTopWidth: 4,
  borderTopStyle: 'solid',
  borderTopColor: 'var(--chalk)',
  transform: 'rotate(-8deg)',
  backgroundImage: chalk,
  backgroundSize: '100% 1px',
  backgroundRepeat: 'no-repeat',
});
const chalkWide = webStyle({
  position: 'absolute',
  top: '-5%',
  bottom: '-5%',
  right: -60,
  width: 90,
  backgroundColor: 'var(--paper)',
  borderLeftWidth: 4,
  borderLeftStyle: 'solid',
  borderLeftColor: 'var(--chalk)',
  transform: 'rotate(4deg)',
});

const styles = StyleSheet.create({
  page: { flex: 1, backgroundColor: color.paper },
  grow: { flexGrow: 1 },
  row: { flexDirection: 'row' },
  wood: { overflow: 'hidden' },
  woodPhone: { height: 230 },
  woodWide: { flex: 1 },
  mark: {
    alignSelf: 'flex-start',
    margin: 24,
    padding: 14,
    backgroundColor: '#F6F2E8',
    borderWidth: 2,
    borderColor: '#14202E',
  },
  column: { padding: space.xl, paddingTop: space.s, width: '100%', maxWidth: 560, alignSelf: 'center' },
  columnWide: { flex: 1, justifyContent: 'center', paddingHorizontal: 72 },
  form: { marginTop: space.xl, gap: space.l },
});
