import { useRouter } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import type { ShopSettings } from '@/geometry/core/settings';
import { may } from '@/shared/roles/roles';
import { ApiError } from '../api/api-problem';
import { useSession } from '../api/use-session';
import { useShop } from '../api/use-shop';
import { Banner } from '../ui/Banner';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { PageFrame } from '../ui/PageFrame';
import { Segmented } from '../ui/Segmented';
import { ErrorState, LoadingState, OfflineState } from '../ui/StateCard';
import { Text } from '../ui/Text';
import { space } from '../ui/tokens';
import { ScrewLengths } from './ScrewLengths';
import { SETTING_GROUPS, withSetting, type SettingGroup } from './setting-fields';
import { SettingInput } from './SettingInput';
import { ShopCard } from './ShopCard';
import { useShopChange } from './use-shop-change';

/** What the shop decides once: names, units, limits of seams, hardware and times. Owners change it, everybody may read it. */
export function SettingsScreen() {
  const router = useRouter();
  return (
    <PageFrame title="Settings" onNavigate={(href) => router.navigate(href as never)}>
      <View style={styles.page}>
        <SettingsContent />
      </View>
    </PageFrame>
  );
}

function SettingsContent() {
  const { me } = useSession();
  const { data: shop, error, refetch, isPending } = useShop();
  const change = useShopChange();
  if (!shop) {
    if (isPending && !error) return <LoadingState title="Fetching the settings" />;
    const offline = error instanceof ApiError && error.problem.kind === 'offline';
    const again = <Button label="Try now" onPress={() => void refetch()} />;
    return offline ? (
      <OfflineState body="The settings come when the signal is back." actions={again} />
    ) : (
      <ErrorState title="The settings did not come" body={error?.message} actions={again} />
    );
  }
  const mayEdit = me !== null && may(me.role, 'shop.edit');
  const metric = shop.units === 'mm';
  const store = (settings: ShopSettings, words: string) => change({ settings }, { settings: shop.settings }, words);
  return (
    <>
      {mayEdit ? (
        <Text kind="second">
          Every change counts for jobs from now on. Revisions that are frozen keep the settings they were made with.
        </Text>
      ) : (
        <Banner icon="lock" fact="Only the owner changes these." />
      )}
      <ShopCard shop={shop} disabled={!mayEdit} onChange={change} />
      {SETTING_GROUPS.map((group) => (
        <GroupCard key={group.title} group={group}>
          {group.title === 'Connectors' && (
            <Segmented
              label="Kind"
              options={CONNECTORS}
              value={shop.settings.connectors.kind}
              disabled={!mayEdit}
              onChange={(kind) =>
                store({ ...shop.settings, connectors: { ...shop.settings.connectors, kind } }, `Connector: ${kind}`)
              }
            />
          )}
          {group.title === 'Screws' && (
            <ScrewLengths
              lengths={shop.settings.screws.lengths}
              metric={metric}
              disabled={!mayEdit}
              onLengths={(lengths) =>
                store({ ...shop.settings, screws: { ...shop.settings.screws, lengths } }, 'Stock of screws')
              }
            />
          )}
          <View style={styles.fields}>
            {group.fields.map((field) => (
              <View key={field.label} style={styles.field}>
                <SettingInput
                  settings={shop.settings}
                  field={field}
                  metric={metric}
                  disabled={!mayEdit}
                  onValue={(value) => store(withSetting(shop.settings, field, value), field.label)}
                />
              </View>
            ))}
          </View>
        </GroupCard>
      ))}
    </>
  );
}

const CONNECTORS = [
  { value: 'loose tenon', label: 'Loose tenon' },
  { value: 'dowel', label: 'Dowel' },
  { value: 'biscuit', label: 'Biscuit' },
] as const;

function GroupCard({ group, children }: { readonly group: SettingGroup; readonly children: ReactNode }) {
  return (
    <Card>
      <View style={styles.group}>
        <Text kind="rowTitle" level={2}>
          {group.title}
        </Text>
        <Text kind="second">{group.does}</Text>
        {children}
      </View>
    </Card>
  );
}

const styles = StyleSheet.create({
  page: { gap: space.l, maxWidth: 920 },
  group: { gap: space.m },
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.l },
  field: { flexGrow: 1, flexBasis: 260, maxWidth: 420 },
});
