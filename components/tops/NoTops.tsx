import { useRouter } from 'expo-router';
import { StyleSheet, View } from 'react-native';

import { firstTops } from '@/shared/layout/first-tops';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { StateCard } from '../ui/StateCard';
import { space } from '../ui/tokens';

/** Nothing is laid yet: offers a first proposal along the walls, or to begin with one top. */
export function NoTops({ onAdd }: { readonly onAdd?: () => void }) {
  const router = useRouter();
  const { job, plan, layout, settings, run } = useOpenJob();
  const lay = () => {
    const lengths = new Map(plan.room?.walls.map((wall) => [wall.id, wall.adjusted]));
    const { runs, cutouts } = firstTops(layout, lengths, settings);
    for (const item of runs) run({ kind: 'addItem', section: 'runs', item }, `run ${item.id}`);
    for (const item of cutouts) run({ kind: 'addItem', section: 'cutouts', item }, 'sink cutout');
  };
  const toRoom = (
    <Button
      label="To the room"
      look={plan.room ? 'secondary' : 'primary'}
      onPress={() => router.navigate(`/jobs/${job.id}/room` as never)}
    />
  );
  return (
    <View style={styles.state}>
      <StateCard
        icon="tops"
        title="No tops yet"
        body={
          !plan.room
            ? 'Tops need a measured room.'
            : onAdd
              ? 'Lay the first tops along the walls; every one can be changed afterwards. Or begin with one of your own.'
              : 'Nobody has laid tops in this room yet.'
        }
        actions={
          <>
            {plan.room && onAdd && <Button label="Lay the first tops" look="primary" onPress={lay} />}
            {onAdd && <Button label="Add a top" icon="plus" onPress={onAdd} />}
            {toRoom}
          </>
        }
      />
    </View>
  );
}

const styles = StyleSheet.create({ state: { padding: space.l } });
