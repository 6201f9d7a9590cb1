import { stageMove, STAGES, type Stage } from '@/shared/roles/stages';
import { useMoveStage } from '../api/use-jobs';
import { useOpenJob } from '../editor/JobProvider';
import { useSession } from '../api/use-session';

/**
 * Moves the job on when a person finishes a step: laying the tops says the room is measured, making the sheets says the
 * tops are drawn. Only one stage forward, and only by those who may; nothing happens otherwise.
 */
export function useReachStage(): (stage: Stage) => void {
  const { job } = useOpenJob();
  const { me } = useSession();
  const move = useMoveStage(job.id);
  return (to) => {
    if (me && stageMove(me.role, job.stage, to).kind === 'allowed' && isForward(job.stage, to)) move.mutate({ to });
  };
}

const isForward = (from: Stage, to: Stage): boolean => STAGES.indexOf(to) > STAGES.indexOf(from);
