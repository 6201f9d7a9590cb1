import { useRouter } from 'expo-router';
import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useStore } from 'zustand';

import { cutSheetPages } from '@/geometry/scene/cut-sheet/cut-sheet-scene';
import { placeSlab } from '@/geometry/scene/slab/placed-slab';
import { useRevisions } from '../api/use-sheets';
import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { Banner } from '../ui/Banner';
import { Button } from '../ui/Button';
import { Segmented } from '../ui/Segmented';
import { StateCard } from '../ui/StateCard';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { RevisionBar } from './RevisionBar';
import { SheetCard } from './SheetCard';
import { sheetHeadOf } from './sheet-head-of';
import { SheetPage } from './SheetPage';
import { useSheetActions } from './use-sheet-actions';
import { useShownPlan } from './use-shown-plan';

/** Job > Sheets: preview, download and print what goes to the saw. */
export function SheetsScreen() {
  const router = useRouter();
  const wide = useWide();
  const { job, store, nest } = useOpenJob();
  const revisions = useRevisions(job.id);
  const [chosen, setChosen] = useState<number | 'draft' | null>(null);
  const [paper, setPaper] = useState<'letter' | 'a4'>('letter');
  const [open, setOpen] = useState(0);
  const [width, setWidth] = useState(0);
  const all = useMemo(() => revisions.data?.revisions ?? [], [revisions.data]);
  const which = chosen ?? all[0]?.number ?? 'draft';
  const shown = useShownPlan(job.id, which);
  const revision = all.find((r) => r.number === which) ?? null;
  const pages = useMemo(() => {
    if (!shown?.plan.nest || shown.plan.nest.slabs.length === 0) return [];
    const head = sheetHeadOf(job, revision, new Date().toISOString());
    return cutSheetPages(shown.plan, shown.layout, head, paper);
  }, [shown, job, revision, paper]);
  const slabs = shown?.plan.nest?.slabs.map((_, i) => placeSlab(shown.plan, shown.layout, i)) ?? [];
  const pending = useStore(store, (state) => state.pending.length);
  const actions = useSheetActions({ job, revision: which, paper });
  const waiting = which === 'draft' && pending > 0;
  const buttons = (
    <View style={styles.buttons}>
      <Button
        label="Download"
        icon="download"
        busy={actions.busy === 'download'}
        disabled={pages.length === 0 || waiting}
        onPress={actions.download}
      />
      <View style={styles.grow}>
        <Button
          label={pages.length === 1 ? 'Print the page' : `Print all ${pages.length}`}
          icon="print"
          look={pages.length > 0 ? 'primary' : 'secondary'}
          wide
          height={wide ? 48 : 56}
          busy={actions.busy === 'print'}
          disabled={pages.length === 0 || waiting}
          onPress={actions.print}
        />
      </View>
    </View>
  );
  const subtitle =
    which === 'draft'
      ? 'Draft, not signed off'
      : revision?.signedOff
        ? `Revision ${which}, signed off by ${revision.signedOff.by.name}`
        : `Revision ${which}, not signed off`;
  return (
    <JobFrame subtitle={subtitle} undo={false} footer={wide ? undefined : <View style={styles.foot}>{buttons}</View>}>
      <View style={styles.page}>
        <RevisionBar revisions={all} which={which} onWhich={setChosen} />
        {actions.error && <Banner look="attention" icon="warn" fact="The sheets did not come." act={actions.error} />}
        {waiting && <Text kind="second">Waiting until your last changes are with the server.</Text>}
        {pages.length === 0 ? (
          <StateCard
            icon="slabs"
            title={nest.searching && which === 'draft' ? 'Trying plans' : 'No slab plan yet'}
            body={
              nest.searching && which === 'draft'
                ? 'The cut sheets come as soon as the pieces are on slabs.'
                : 'A cut sheet needs pieces that are laid on slabs.'
            }
            actions={<Button label="To the slabs" onPress={() => router.navigate(`/jobs/${job.id}/slabs` as never)} />}
          />
        ) : (
          <View style={[styles.body, wide && styles.row]}>
            <View style={[styles.cards, wide && styles.cardsWide]} role="list" aria-label="Sheets">
              {slabs.map((slab, index) => (
                <SheetCard
                  key={index}
                  title={`Cut sheet ${index + 1}`}
                  detail={`${slab.name[0]!.toUpperCase()}${slab.name.slice(1)}, ${letters(slab.pieces.map((p) => p.letter))}`}
                  note={`${slab.cuts.length} saw cuts`}
                  scene={pages[index]!}
                  paper={paper}
                  current={wide && index === open}
                  onPress={() => setOpen(index)}
                />
              ))}
              <Segmented
                label="Paper"
                options={[
                  { value: 'letter', label: 'Letter' },
                  { value: 'a4', label: 'A4' },
                ]}
                value={paper}
                onChange={setPaper}
              />
              {wide && buttons}
              <Text kind="small">
                Saw, dust and lifting: guards on, extraction running, two people for long pieces. Local codes and the
                maker’s instructions come first.
              </Text>
            </View>
            <View style={styles.preview} onLayout={(event) => setWidth(event.nativeEvent.layout.width)}>
              {width > 0 && pages[Math.min(open, pages.length - 1)] && (
                <SheetPage
                  scene={pages[Math.min(open, pages.length - 1)]!}
                  paper={paper}
                  width={Math.min(width, 1100)}
                />
              )}
            </View>
          </View>
        )}
      </View>
    </JobFrame>
  );
}

const letters = (all: readonly string[]): string =>
  all.length < 2 ? all.join('') : `${all.slice(0, -1).join(', ')} and ${all[all.length - 1]}`;

const styles = StyleSheet.create({
  page: { gap: space.m },
  body: { gap: space.l },
  row: { flexDirection: 'row', alignItems: 'flex-start' },
  cards: { gap: space.m },
  cardsWide: { width: 372 },
  preview: { flexGrow: 1, flexShrink: 1, minWidth: 0 },
  buttons: { flexDirection: 'row', gap: space.m },
  grow: { flex: 1 },
  foot: { padding: space.m, backgroundColor: color.paper },
});
