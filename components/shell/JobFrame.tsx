import { usePathname, useRouter } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { useStore } from 'zustand';

import { isOpen } from '@/geometry/findings/acceptance';
import { useOpenJob, useSaveWords } from '../editor/JobProvider';
import { jobNumber } from '../jobs/job-words';
import { Icon } from '../ui/Icon';
import { IconButton } from '../ui/IconButton';
import type { NavItem } from '../ui/nav-item';
import { PageFrame, type PageFrameProps } from '../ui/PageFrame';
import { Text } from '../ui/Text';
import { color, space } from '../ui/tokens';
import { useWide } from '../ui/use-wide';
import { RefusedEdits } from './RefusedEdits';
import { useUndoKeys } from './use-undo-keys';

export interface JobFrameProps extends Pick<
  PageFrameProps,
  'inspector' | 'fill' | 'barHidden' | 'footer' | 'children'
> {
  /** Second line of the header on a phone: "Room: 2 of 3 walls, 1 of 2 corners". */
  readonly subtitle: string;
  /** The one primary act, top right on wide screens. */
  readonly primary?: ReactNode;
  /** Further header actions of the step (layers, more). */
  readonly actions?: ReactNode;
  /** Leave undo out where nothing can be changed. */
  readonly undo?: boolean;
}

/** The frame of every step of a job: names, steps, undo, save state, and what could not be kept. */
export function JobFrame({ subtitle, primary, actions, undo = true, ...page }: JobFrameProps) {
  const router = useRouter();
  const wide = useWide();
  const { job, store, undo: undoLast, redo: redoLast, mayEdit } = useOpenJob();
  const canUndo = useStore(store, (state) => state.undo.length > 0);
  const canRedo = useStore(store, (state) => state.redo.length > 0);
  const steps = useSteps();
  useUndoKeys(undoLast, redoLast, mayEdit && undo);
  const showUndo = mayEdit && undo;
  return (
    <PageFrame
      {...page}
      title={job.name}
      subtitle={wide ? `${jobNumber(job.number)}, ${subtitle}` : subtitle}
      steps={steps}
      back={{ label: 'Back to the jobs', href: '/jobs' }}
      onNavigate={(href) => router.navigate(href as never)}
      actions={
        <>
          <SaveState />
          {showUndo && <IconButton icon="undo" label="Undo" disabled={!canUndo} onPress={undoLast} />}
          {showUndo && (wide || canRedo) && (
            <IconButton icon="redo" label="Redo" disabled={!canRedo} onPress={redoLast} />
          )}
          {actions}
          {wide && primary}
        </>
      }
      notice={<RefusedEdits />}
    />
  );
}

function useSteps(): NavItem[] {
  const { job, plan, layout } = useOpenJob();
  const path = usePathname();
  const count = plan.findings.filter((finding) => finding.severity !== 'note' && isOpen(layout, finding)).length;
  const all: Omit<NavItem, 'href'>[] = [
    { key: 'room', label: 'Room', icon: 'room' },
    { key: 'tops', label: 'Tops', icon: 'tops', count },
    { key: 'slabs', label: 'Slabs', icon: 'slabs' },
    { key: 'sheets', label: 'Sheets', icon: 'sheets' },
    { key: 'work', label: 'Work', icon: 'saw' },
  ];
  return all.map((item) => {
    const href = `/jobs/${job.id}/${item.key}`;
    return { ...item, href, current: path === href };
  });
}

/** Only what is not yet with the server is said; "Saved" is what people expect. */
function SaveState() {
  const { store } = useOpenJob();
  const { words, offline } = useSaveWords(store);
  const wide = useWide();
  const quiet = words === 'Saved' || words === 'Saving';
  return (
    <View role="status" style={styles.state}>
      {offline && <Icon name="cloudoff" size={20} tone="ink2" />}
      {quiet ? wide && <Text kind="small">{words}</Text> : <Text kind="small">{words}</Text>}
    </View>
  );
}

const styles = StyleSheet.create({
  state: { flexDirection: 'row', alignItems: 'center', gap: space.xs, borderColor: color.edge, maxWidth: 150 },
});
