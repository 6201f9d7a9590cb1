import { useRouter } from 'expo-router';
import { useRef } from 'react';

import { firstTops } from '@/shared/layout/first-tops';
import type { EditDraft } from '@/shared/layout/apply-edit';
import { useOpenJob } from '../editor/JobProvider';
import { useReachStage } from '../shell/use-reach-stage';
import { Button } from '../ui/Button';
import type { RoomView } from './use-room-view';

/** The way on: lays the first tops where there are none, then goes to them. */
export function LayTops({ view, wide = false }: { readonly view: RoomView; readonly wide?: boolean }) {
  const router = useRouter();
  const { job, layout, plan, run, settings, mayEdit } = useOpenJob();
  const reach = useReachStage();
  const laid = useRef(false);
  const ready = view.room.fit !== null && view.room.error === null && view.room.untaped.length === 0;
  const has = layout.runs.length > 0 || layout.islands.length > 0;
  const go = () => {
    if (!has && mayEdit && !laid.current) {
      laid.current = true;
      const lengths = new Map(plan.room?.walls.map((wall) => [wall.id, wall.adjusted]));
      const { runs, cutouts } = firstTops(layout, lengths, settings);
      const edits: [EditDraft, string][] = [
        ...runs.map((item): [EditDraft, string] => [{ kind: 'addItem', section: 'runs', item }, `run ${item.id}`]),
        ...cutouts.map((item): [EditDraft, string] => [{ kind: 'addItem', section: 'cutouts', item }, 'sink cutout']),
      ];
      for (const [edit, label] of edits) run(edit, label);
    }
    reach('measured');
    router.navigate(`/jobs/${job.id}/tops` as never);
  };
  return (
    <Button
      label={has ? 'To the tops' : 'Lay the tops'}
      look={ready ? 'primary' : 'secondary'}
      iconAfter="next"
      wide={wide}
      height={wide ? 56 : 48}
      disabled={!ready}
      onPress={go}
    />
  );
}
