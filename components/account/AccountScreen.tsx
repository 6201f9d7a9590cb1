import { useRouter } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { ROLE_NAMES } from '@/shared/roles/roles';
import { useSession, useSignOut } from '../api/use-session';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Checkbox } from '../ui/Checkbox';
import { Dialog } from '../ui/Dialog';
import { PageFrame } from '../ui/PageFrame';
import { useLeftHandPad, useSingleKeys } from '../ui/preferences';
import { Segmented } from '../ui/Segmented';
import { Text } from '../ui/Text';
import { useTheme } from '../ui/ThemeProvider';
import { space } from '../ui/tokens';

/** Who is signed in, how the screen looks on this device, and the way out. */
export function AccountScreen() {
  const router = useRouter();
  const { me } = useSession();
  const theme = useTheme();
  const [leftHand, setLeftHand] = useLeftHandPad();
  const [singleKeys, setSingleKeys] = useSingleKeys();
  const [leaving, setLeaving] = useState(false);
  const signOut = useSignOut();
  return (
    <PageFrame title="Account" onNavigate={(href) => router.navigate(href as never)}>
      <View style={styles.page}>
        <Card>
          <View style={styles.card}>
            <Text kind="rowTitle" level={2}>
              {me?.name ?? ''}
            </Text>
            <Text kind="second">{me ? `${ROLE_NAMES[me.role]} of ${me.shop.name}, ${me.email}` : ''}</Text>
          </View>
        </Card>
        <Card>
          <View style={styles.card}>
            <Text kind="rowTitle" level={2}>
              On this device
            </Text>
            <Segmented
              label="Light or dark"
              options={[
                { value: 'system', label: 'As the device' },
                { value: 'light', label: 'Light' },
                { value: 'dark', label: 'Dark' },
              ]}
              value={theme.choice}
              onChange={theme.setChoice}
            />
            <Checkbox
              label="Pad for the left hand"
              hint="The digits stand on the left."
              checked={leftHand}
              onChange={setLeftHand}
            />
            <Checkbox
              label="Single-key shortcuts"
              hint="J and K in lists, / to search, arrows on a drawing."
              checked={singleKeys}
              onChange={setSingleKeys}
            />
          </View>
        </Card>
        <Button
          label="Shop settings"
          icon="settings"
          href="/settings"
          onPress={() => router.navigate('/settings' as never)}
        />
        <Button label="Sign out" icon="leave" onPress={() => setLeaving(true)} />
      </View>
      <Dialog
        open={leaving}
        title="Sign out on this device?"
        onClose={() => setLeaving(false)}
        actions={
          <>
            <Button label="Stay" onPress={() => setLeaving(false)} />
            <Button
              label="Sign out"
              look="primary"
              busy={signOut.isPending}
              onPress={() => signOut.mutate(undefined, { onSettled: () => router.replace('/sign-in' as never) })}
            />
          </>
        }
      >
        <Text>Readings that are not yet sent stay on this device and go out after the next sign-in.</Text>
      </Dialog>
    </PageFrame>
  );
}

const styles = StyleSheet.create({
  page: { gap: space.l, maxWidth: 560 },
  card: { gap: space.m },
});
