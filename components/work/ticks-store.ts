import { createStore, type StoreApi } from 'zustand/vanilla';

import { marksAfter, type WorkAct, type WorkDeed, type WorkMark, type WorkMarks } from '@/shared/work/work-marks';

/** What this browser keeps of a job's ticks, so that nothing is lost without signal. */
export interface TicksRecord {
  /** As the server had it last. */
  readonly known: readonly WorkMark[];
  /** Done here and not yet known to be with the server, oldest first. */
  readonly pending: readonly WorkAct[];
}

export interface TicksState extends TicksRecord {
  /** Known plus pending: what the person sees. */
  readonly marks: WorkMarks;
  readonly sync: 'idle' | 'sending' | 'offline' | 'refused';
  readonly act: (step: string, act: WorkDeed, waitHours: number) => void;
  /** The server's answer: how all steps stand, with the deeds that it has now. */
  readonly receive: (marks: readonly WorkMark[], settled: ReadonlySet<string>) => void;
  readonly setSync: (sync: TicksState['sync']) => void;
}

export type TicksStore = StoreApi<TicksState>;

export const NO_TICKS: TicksRecord = { known: [], pending: [] };

export interface TicksMaker {
  /** Name of the person signed in. */
  readonly by: string;
  readonly newId?: () => string;
  readonly now?: () => Date;
}

/** The ticks of one job in one browser. */
export function createTicksStore(record: TicksRecord, maker: TicksMaker): TicksStore {
  const { by, newId = () => crypto.randomUUID(), now = () => new Date() } = maker;
  return createStore<TicksState>((set, get) => ({
    ...record,
    marks: marksOf(record),
    sync: 'idle',
    act(step, act, waitHours) {
      const pending = [...get().pending, { id: newId(), step, act, at: now().toISOString(), waitHours, by }];
      set({ pending, marks: marksOf({ known: get().known, pending }) });
    },
    receive(known, settled) {
      const pending = get().pending.filter(({ id }) => !settled.has(id));
      set({ known, pending, marks: marksOf({ known, pending }) });
    },
    setSync: (sync) => set({ sync }),
  }));
}

const marksOf = ({ known, pending }: TicksRecord): WorkMarks =>
  marksAfter(pending, Object.fromEntries(known.map((mark) => [mark.step, mark])));

/** "2 to send" while something is not with the server; nothing else has to be said. */
export function ticksWords({ pending, sync }: Pick<TicksState, 'pending' | 'sync'>): string | null {
  if (sync === 'refused') return 'Ticks could not be kept';
  if (pending.length === 0) return sync === 'offline' ? 'Works offline' : null;
  return sync === 'offline' ? `Ticked here, ${pending.length} to send` : 'Saving';
}
