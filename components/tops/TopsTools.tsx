import { StyleSheet, View } from 'react-native';

import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import type { IconName } from '../ui/icon-shapes';
import { color, radius, space } from '../ui/tokens';
import type { TopsSide, TopsView } from './use-tops-view';

/** What can be done with the tops as a whole: a bar on the canvas of wide screens, a row in the sheet on a phone. */
export function TopsTools({ view, floating }: { readonly view: TopsView; readonly floating?: boolean }) {
  const { mayEdit } = useOpenJob();
  // A phone has room for the words alone.
  const sign = (icon: IconName) => (floating ? icon : undefined);
  const open = (side: TopsSide) => view.show(view.side === side ? 'lists' : side);
  return (
    <View role="group" aria-label="Tools" style={[styles.tools, floating && styles.bar]}>
      {mayEdit && (
        <Button
          label="Add"
          spoken="Add a top"
          icon={sign('plus')}
          height={44}
          pressed={view.side === 'add'}
          onPress={() => open('add')}
        />
      )}
      <Button
        label={view.picture ? 'Plan' : 'Picture'}
        spoken={view.picture ? 'Back to the plan' : 'Picture of the finished tops'}
        icon={sign(view.picture ? 'tops' : 'eye')}
        height={44}
        onPress={() => view.setPicture(!view.picture)}
      />
      <Button
        label="Before"
        spoken="Compare before and after"
        icon={sign('turn')}
        height={44}
        pressed={view.side === 'compare'}
        onPress={() => open('compare')}
      />
      <Button
        label={floating ? 'Job settings' : 'Settings'}
        spoken="Job settings"
        icon={sign('settings')}
        height={44}
        pressed={view.side === 'job'}
        onPress={() => open('job')}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  tools: { flexDirection: 'row', flexWrap: 'wrap', gap: space.xs },
  bar: {
    gap: space.s,
    padding: 6,
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
    backgroundColor: color.card,
    alignSelf: 'flex-start',
  },
});
