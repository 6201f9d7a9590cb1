import { useRouter } from 'expo-router';
import { useMemo, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useStore } from 'zustand';

import { labelGrid, usualGrid, type LabelChoice } from '@/geometry/scene/labels/label-grids';
import type { Paper } from '@/geometry/scene/paper/sheet-head';
import type { RevisionSummary } from '@/shared/contracts/revisions';
import { useMay } from '../api/use-session';
import { usePrints } from '../api/use-sheet-acts';
import { useRevisions } from '../api/use-sheets';
import { useOpenJob } from '../editor/JobProvider';
import { JobFrame } from '../shell/JobFrame';
import { Banner } from '../ui/Banner';
import { Button } from '../ui/Button';
import { MoreMenu } from '../ui/Menu';
import { Segmented } from '../ui/Segmented';
import { StateCard } from '../ui/StateCard';
import { Text } from '../ui/Text';
import { useToast } from '../ui/ToastProvider';
import { color, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { LabelChoiceFields } from './LabelChoiceFields';
import { MailDialog } from './MailDialog';
import { planFiles } from './plan-files';
import { printedBefore } from './printed-before';
import { RevisionBar } from './RevisionBar';
import { saveText } from './save-file';
import { SheetCard } from './SheetCard';
import { sheetHeadOf } from './sheet-head-of';
import { sheetItems } from './sheet-list';
import { SheetPreview } from './SheetPreview';
import { shareAddress } from './share-address';
import { useSheetActions } from './use-sheet-actions';
import { useShownPlan } from './use-shown-plan';

/** Job > Sheets: what goes to the saw, the bench, the house and the customer, to look at, print, send and keep. */
export function SheetsScreen() {
  const wide = useWide();
  const toast = useToast();
  const { job, store, settings } = useOpenJob();
  const prices = useMay('price.see');
  const revisions = useRevisions(job.id);
  const prints = usePrints(job.id);
  const [chosen, setChosen] = useState<number | 'draft' | null>(null);
  const [paper, setPaper] = useState<Paper>('letter');
  const [chosenLabels, setLabels] = useState<LabelChoice | null>(null);
  const [open, setOpen] = useState<string | null>(null);
  const [mailing, setMailing] = useState(false);
  const all = useMemo(() => revisions.data?.revisions ?? [], [revisions.data]);
  const which = chosen ?? all[0]?.number ?? 'draft';
  const shown = useShownPlan(job.id, which);
  const revision = all.find((r) => r.number === which) ?? null;
  const labels = useMemo<LabelChoice>(
    () =>
      chosenLabels && labelGrid(chosenLabels.grid).paper === paper
        ? chosenLabels
        : { grid: usualGrid(paper), start: 1 },
    [chosenLabels, paper],
  );
  const items = useMemo(() => {
    if (!shown || shown.plan.pieces.length === 0) return [];
    const head = sheetHeadOf(job, revision, new Date().toISOString());
    return sheetItems({ ...shown, settings, head, paper, prices, labels });
  }, [shown, job, revision, settings, paper, prices, labels]);
  const item = items.find((one) => one.key === open) ?? items[0];
  const pending = useStore(store, (state) => state.pending.length);
  const actions = useSheetActions({ job, revision: which, paper, labels });
  const waiting = which === 'draft' && pending > 0;
  const pages = items.reduce((sum, one) => sum + one.pages.length, 0);
  const old = printedBefore(prints.data?.prints ?? [], all[0]?.number ?? null);
  const files = shown
    ? planFiles({ ...shown, settings, jobName: job.name, number: String(job.number).padStart(4, '0'), prices })
    : [];
  const share = async () => {
    const how = await shareAddress(window.location.href, job.name);
    if (how === 'copied') toast({ text: 'The address of these sheets is copied' });
    if (how === 'failed') toast({ tone: 'failure', text: 'This browser would not share. Copy the address by hand.' });
  };
  const menu = [
    ...(which === 'draft' ? [] : [{ key: 'mail', icon: 'mail', label: 'Mail to somebody of the crew', onPress: () => setMailing(true) } as const]), // prettier-ignore
    { key: 'share', icon: 'share', label: 'Share the address', onPress: () => void share() } as const,
    { key: 'zip', icon: 'download', label: 'Everything in one archive', onPress: actions.bundle } as const,
    ...files.map((file) => ({
      key: file.name,
      icon: 'download' as const,
      label: file.label,
      onPress: () => saveText(file.name, file.write(), file.type),
    })),
  ];
  const printAll = (
    <Button
      label={`Print all ${pages} pages`}
      icon="print"
      look={pages > 0 ? 'primary' : 'secondary'}
      wide
      height={wide ? 48 : 56}
      busy={actions.busy === 'print'}
      disabled={pages === 0 || waiting}
      onPress={() => actions.print('all')}
    />
  );
  return (
    <JobFrame
      subtitle={subtitleOf(which, revision)}
      undo={false}
      actions={items.length > 0 ? <MoreMenu label="Send and export" icon="share" items={menu} /> : undefined}
      footer={wide || items.length === 0 ? undefined : <View style={styles.foot}>{printAll}</View>}
    >
      <View style={styles.page}>
        <RevisionBar revisions={all} which={which} onWhich={setChosen} />
        {old && (
          <Banner
            look="attention"
            icon="bin"
            fact={`Revision ${old.revision} was printed.`}
            act={`Bin it before cutting. It was ${old.by ? `${old.by}, ` : ''}${new Date(old.at).toLocaleDateString()}.`}
          />
        )}
        {actions.error && <Banner look="attention" icon="warn" fact="The file did not come." act={actions.error} />}
        {waiting && <Text kind="second">Waiting until your last changes are with the server.</Text>}
        {!item ? (
          <NothingYet draft={which === 'draft'} loading={shown === null} />
        ) : (
          <View style={[styles.body, wide && styles.row]}>
            <View style={[styles.cards, wide && styles.cardsWide]}>
              <View role="list" aria-label="Sheets" style={styles.cards}>
                {items.map((one) => (
                  <SheetCard
                    key={one.key}
                    title={one.title}
                    detail={one.detail}
                    note={one.note}
                    scene={one.pages[0]!}
                    paper={paper}
                    current={one.key === item.key}
                    onPress={() => setOpen(one.key)}
                  />
                ))}
              </View>
              <Segmented
                label="Paper"
                options={[
                  { value: 'letter', label: 'Letter' },
                  { value: 'a4', label: 'A4' },
                ]}
                value={paper}
                onChange={setPaper}
              />
              {wide && printAll}
              {items.every((one) => one.kind !== 'cut') && (
                <Text kind="second">Cut sheets come as soon as the pieces are laid on slabs.</Text>
              )}
              <Text kind="small">
                Saw, dust and lifting: guards on, extraction running, two people for long pieces. Local codes and the
                maker’s instructions come first.
              </Text>
            </View>
            <SheetPreview key={`${item.key} ${which}`} item={item} paper={paper} actions={actions} disabled={waiting}>
              {item.kind === 'labels' && <LabelChoiceFields paper={paper} value={labels} onChange={setLabels} />}
            </SheetPreview>
          </View>
        )}
      </View>
      {mailing && which !== 'draft' && <MailDialog jobId={job.id} revision={which} onClose={() => setMailing(false)} />}
    </JobFrame>
  );
}

function subtitleOf(which: number | 'draft', revision: RevisionSummary | null): string {
  if (which === 'draft') return 'Draft, not signed off';
  return revision?.signedOff
    ? `Revision ${which}, signed off by ${revision.signedOff.by.name}`
    : `Revision ${which}, not signed off`;
}

function NothingYet({ draft, loading }: { readonly draft: boolean; readonly loading: boolean }) {
  const router = useRouter();
  const { job, nest } = useOpenJob();
  if (loading) return <StateCard icon="clock" title="Fetching the revision" announce="status" />;
  return (
    <StateCard
      icon="tops"
      title={nest.searching && draft ? 'Trying plans' : 'Nothing to print yet'}
      body="Sheets are drawn from the tops: lay them first."
      actions={<Button label="To the tops" onPress={() => router.navigate(`/jobs/${job.id}/tops` as never)} />}
    />
  );
}

const styles = StyleSheet.create({
  page: { gap: space.m },
  body: { gap: space.l },
  row: { flexDirection: 'row', alignItems: 'flex-start' },
  cards: { gap: space.m },
  cardsWide: { width: 372 },
  foot: { padding: space.m, backgroundColor: color.paper },
});
