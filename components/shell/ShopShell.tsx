import { usePathname, useRouter } from 'expo-router';
import { Suspense, useEffect, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { may } from '@/shared/roles/roles';
import { startSession } from '../api/client';
import { useSession } from '../api/use-session';
import { AppShell } from '../ui/AppShell';
import { Logo } from '../ui/Logo';
import type { NavItem } from '../ui/nav-item';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';

/** The frame of everything behind sign-in; whoever is not signed in is sent there and comes back to this address. */
export function ShopShell({ children }: { readonly children: ReactNode }) {
  const router = useRouter();
  const path = usePathname();
  const { status, me } = useSession();

  useEffect(() => {
    if (status === 'starting') void startSession();
    if (status === 'out') router.replace(`/sign-in?to=${encodeURIComponent(path)}` as never);
    // The address at the time of the sign-out is the one to come back to.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [status]);

  if (status !== 'in') return <Opening />;
  return (
    <AppShell
      sections={sections(path, me !== null && may(me.role, 'stock.see'))}
      onNavigate={(href) => router.navigate(href as never)}
    >
      <Suspense fallback={<Opening />}>{children}</Suspense>
    </AppShell>
  );
}

/** Sections of the shop that have a page. */
function sections(path: string, seesStock: boolean): NavItem[] {
  const all: NavItem[] = [
    { key: 'jobs', label: 'Jobs', icon: 'jobs', href: '/jobs' },
    ...(seesStock ? [{ key: 'stock', label: 'Stock', icon: 'stock', href: '/stock' } as const] : []),
    { key: 'crew', label: 'Crew', icon: 'crew', href: '/crew' },
    { key: 'account', label: 'Account', icon: 'person', href: '/account' },
  ];
  return all.map((item) => ({ ...item, current: path.startsWith(item.href) }));
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
