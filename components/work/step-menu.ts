import { moveStep, type WorkStep } from '@/geometry/wood/arrange-work';
import type { EditDraft } from '@/shared/layout/apply-edit';
import type { WorkDeed } from '@/shared/work/work-marks';
import type { MenuItem } from '../ui/Menu';
import type { StepQuestion } from './StepDialog';
import type { StepState } from './step-state';

export interface StepMenuInput {
  readonly step: WorkStep;
  readonly steps: readonly WorkStep[];
  readonly state: StepState;
  readonly started: boolean;
  readonly mayTick: boolean;
  readonly mayEdit: boolean;
  readonly act: (act: WorkDeed) => void;
  readonly ask: (question: StepQuestion) => void;
  readonly run: (edit: EditDraft, label: string) => boolean;
}

/** Everything that can be done with a step beside ticking it. */
export function stepMenu(input: StepMenuInput): readonly MenuItem[] {
  return [...(input.mayTick ? tickItems(input) : []), ...(input.mayEdit ? editItems(input) : [])];
}

function tickItems({ step, state, started, act }: StepMenuInput): readonly MenuItem[] {
  const items: MenuItem[] = [];
  if (state.kind === 'done')
    items.push({ key: 'undo', icon: 'undo', label: 'Take the tick back', onPress: () => act('undo') });
  if (state.kind === 'waits' || state.kind === 'curing')
    items.push({ key: 'anyway', icon: 'check', label: 'It is done all the same', onPress: () => act('done') });
  if (step.clock && started && state.kind !== 'done')
    items.push({ key: 'stop', icon: 'undo', label: 'Stop the glue clock', onPress: () => act('undo') });
  return items;
}

function editItems({ step, steps, state, ask, run }: StepMenuInput): readonly MenuItem[] {
  const move = (by: -1 | 1): MenuItem[] => {
    const order = moveStep(steps, step.key, by);
    if (!order) return [];
    const way = by === -1 ? 'earlier' : 'later';
    return [
      {
        key: way,
        icon: by === -1 ? 'up' : 'down',
        label: `Move ${way}`,
        onPress: () => void run({ kind: 'orderSteps', order: [...order] }, `${step.step} ${way}`),
      },
    ];
  };
  const change = (label: string, fields: Change) => () =>
    void run({ kind: 'changeStep', step: step.key, change: fields }, label);
  return [
    ...(state.kind === 'done' ? [] : [...move(-1), ...move(1)]),
    { key: 'words', icon: 'pencil', label: 'Edit words and hours', onPress: () => ask({ kind: 'words', step }) },
    ...(step.changed
      ? [
          {
            key: 'generated',
            icon: 'retake',
            label: 'Back to the usual words',
            onPress: change(`usual words of ${step.key}`, { text: null, caution: null, hours: null }),
          } as const,
        ]
      : []),
    { key: 'add', icon: 'plus', label: 'Add a step before', onPress: () => ask({ kind: 'add', before: step }) },
    ...leaveOut({ step, state, ask, run, change }),
  ];
}

type Change = Extract<EditDraft, { kind: 'changeStep' }>['change'];

interface LeaveOut extends Pick<StepMenuInput, 'step' | 'state' | 'ask' | 'run'> {
  readonly change: (label: string, fields: Change) => () => void;
}

function leaveOut({ step, state, ask, change, run }: LeaveOut): readonly MenuItem[] {
  if (state.kind === 'done') return [];
  if (step.added)
    return [
      {
        key: 'remove',
        icon: 'bin',
        label: 'Take the step away',
        danger: true,
        onPress: () => void run({ kind: 'removeStep', step: step.key }, `step ${step.step} taken away`),
      },
    ];
  return step.skipped === null
    ? [{ key: 'skip', icon: 'minus', label: 'Leave it out', onPress: () => ask({ kind: 'skip', step }) }]
    : [
        {
          key: 'back',
          icon: 'plus',
          label: 'Put it back in',
          onPress: change(`${step.step} back in`, { skipped: null }),
        },
      ];
}
