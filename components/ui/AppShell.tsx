import { createContext, useCallback, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { BottomBar } from './BottomBar';
import type { NavItem } from './nav-item';
import { Press } from './Press';
import { Rail } from './Rail';
import { Text } from './Text';
import { color } from './tokens';
import { useWide } from './use-wide';

/** Where "Skip to content" goes; PageFrame carries it. */
export const CONTENT_ID = 'content';

export interface AppShellProps {
  /** Jobs, Rack, Stock, Crew: what the person's role may open. */
  readonly sections: readonly NavItem[];
  /** At the foot of the rail: settings, account. On phones they are reached from the person's own page. */
  readonly foot?: readonly NavItem[];
  readonly home?: string;
  readonly onNavigate: (href: string) => void;
  readonly children: ReactNode;
}

/**
 * The frame of everything behind sign-in: the rail at the left from 900 px on, else a bar at the foot. Screens inside
 * draw a PageFrame. The bar gives way while something else holds the foot (`useBarAway`).
 */
export function AppShell({ sections, foot, home = '/jobs', onNavigate, children }: AppShellProps) {
  const wide = useWide();
  const [holders, setHolders] = useState(0);
  const takeBar = useCallback(() => {
    setHolders((count) => count + 1);
    return () => setHolders((count) => count - 1);
  }, []);
  const bar = useMemo(() => ({ take: takeBar }), [takeBar]);
  return (
    <BarContext.Provider value={bar}>
      <View style={[styles.shell, wide && styles.wide]}>
        <SkipLink />
        {wide && <Rail items={sections} foot={foot} home={home} onNavigate={onNavigate} />}
        <View style={styles.page}>{children}</View>
        {!wide && holders === 0 && <BottomBar items={sections} label="Sections" onNavigate={onNavigate} />}
      </View>
    </BarContext.Provider>
  );
}

const BarContext = createContext<{ readonly take: () => () => void }>({ take: () => () => undefined });

/** Takes the shop's bottom bar away while `away` holds: the steps of a job stand there, or the pad is open. */
export function useBarAway(away: boolean): void {
  const { take } = useContext(BarContext);
  useEffect(() => (away ? take() : undefined), [away, take]);
}

function SkipLink() {
  const [shown, setShown] = useState(false);
  return (
    <Press
      onPress={() => document.getElementById(CONTENT_ID)?.focus()}
      onFocus={() => setShown(true)}
      onBlur={() => setShown(false)}
      style={[styles.skip, !shown && styles.skipAway]}
    >
      <Text kind="label" tone="onchalk">
        Skip to content
      </Text>
    </Press>
  );
}

const styles = StyleSheet.create({
  shell: { flex: 1, minHeight: 0, backgroundColor: color.paper },
  wide: { flexDirection: 'row' },
  page: { flex: 1, minWidth: 0, minHeight: 0 },
  skip: { position: 'absolute', top: 8, left: 8, zIndex: 100, padding: 14, backgroundColor: color.chalk },
  skipAway: { top: -200 },
});
