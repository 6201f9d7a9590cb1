import { usePathname, useRouter } from 'expo-router';
import { useEffect, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { startSession } from '../api/client';
import { useMay, useSession } from '../api/use-session';
import { AppShell } from '../ui/AppShell';
import { Logo } from '../ui/Logo';
import type { NavItem } from '../ui/nav-item';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** The frame of everything behind sign-in; whoever is not signed in is sent there and comes back to this address. */
export function ShopShell({ children }: { readonly children: ReactNode }) {
  const router = useRouter();
  const path = usePathname();
  const { status } = useSession();
  const items = useSections(path);

  useEffect(() => {
    if (status === 'starting') void startSession();
    if (status === 'out') router.replace(`/sign-in?to=${encodeURIComponent(path)}` as never);
    // The address at the time of the sign-out is the one to come back to.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [status]);

  if (status !== 'in') return <Opening />;
  return (
    <AppShell sections={items} onNavigate={(href) => router.navigate(href as never)}>
      {children}
    </AppShell>
  );
}

function useSections(path: string): NavItem[] {
  const seesStock = useMay('stock.see');
  const seesRack = useMay('rack.see');
  const all: (NavItem & { readonly shown: boolean })[] = [
    { key: 'jobs', label: 'Jobs', icon: 'jobs', href: '/jobs', shown: true },
    { key: 'stock', label: 'Stock', icon: 'stock', href: '/stock', shown: seesStock },
    { key: 'rack', label: 'Rack', icon: 'rack', href: '/rack', shown: seesRack },
    { key: 'account', label: 'Account', icon: 'person', href: '/account', shown: true },
  ];
  return all
    .filter(({ shown }) => shown)
    .map(({ shown: _shown, ...item }) => ({ ...item, current: path.startsWith(item.href) }));
}

function Opening() {
  return (
    <View style={styles.opening} role="status">
      <Logo size={64} />
      <Text kind="second">Opening Offsquare</Text>
    </View>
  );
}

const styles = StyleSheet.create({
  opening: { flex: 1, alignItems: 'center', justifyContent: 'center', gap: space.l, backgroundColor: color.paper },
});
