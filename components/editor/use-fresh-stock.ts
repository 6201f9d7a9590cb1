import { useEffect, useRef } from 'react';
import { useStore } from 'zustand';

import { takeStock } from '@/shared/contracts/layouts';
import { call } from '../api/client';
import type { EditorStore } from './editor-store';

/**
 * Brings the shop's stock of the job's wood into the layout: when the job is opened, and whenever its wood or thickness
 * changes. Waits until the server has everything typed here; without signal the slabs stay as they were.
 */
export function useFreshStock(store: EditorStore, layoutId: string, mayEdit: boolean): void {
  const wood = useStore(store, (state) => `${state.confirmed.material.species} ${state.confirmed.material.thickness}`);
  const settled = useStore(store, (state) => state.pending.length === 0 && state.sync === 'idle');
  const asked = useRef<string | null>(null);
  useEffect(() => {
    if (!mayEdit || !settled || asked.current === wood) return;
    asked.current = wood;
    const { base } = store.getState();
    call(takeStock, { params: { layoutId }, body: { base, editId: crypto.randomUUID() } })
      .then(({ seq, edits }) => {
        // Something typed meanwhile is rebased; an answer to an older question is dropped.
        if (store.getState().base === base)
          store.getState().receive({ seq, edits: edits.map((logged) => logged.edit), refused: [] });
      })
      .catch(() => {
        // Without signal the next chance asks again.
        asked.current = null;
      });
  }, [store, layoutId, mayEdit, wood, settled]);
}
