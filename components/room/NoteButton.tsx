import { useState } from 'react';

import { wallLabel } from '@/geometry/core/layout';
import { useOpenJob } from '../editor/JobProvider';
import { Button } from '../ui/Button';
import { Dialog } from '../ui/Dialog';
import { Field } from '../ui/Field';
import type { Target } from './tape-walk';

/** A note for whoever comes next, kept where it was made. */
export function NoteButton({ target }: { readonly target: Target | null }) {
  const { layout, run } = useOpenJob();
  const [open, setOpen] = useState(false);
  const [text, setText] = useState('');
  const [error, setError] = useState<string | undefined>();
  const wall = target?.kind === 'wall' ? target.wall : target?.kind === 'corner' ? target.between[0] : undefined;
  const keep = () => {
    if (text.trim() === '') return setError('Type the note first.');
    const item = { id: freshNoteId(layout.notes), text: text.trim(), ...(wall !== undefined && { wall }) };
    if (!run({ kind: 'addItem', section: 'notes', item }, 'a note')) return;
    setText('');
    setError(undefined);
    setOpen(false);
  };
  const label = wall === undefined ? '' : `, wall ${wallLabel(layout.room.walls.findIndex((w) => w.id === wall))}`;
  return (
    <>
      <Button label="Note" icon="plus" height={56} spoken={`Add a note${label}`} onPress={() => setOpen(true)} />
      <Dialog
        open={open}
        title={`Note${label}`}
        onClose={() => setOpen(false)}
        actions={
          <>
            <Button label="Cancel" onPress={() => setOpen(false)} />
            <Button label="Keep the note" look="primary" onPress={keep} />
          </>
        }
      >
        <Field
          label="What should be known here"
          value={text}
          onChange={setText}
          error={error}
          rowCount={4}
          maxLength={2000}
          autoFocus
        />
      </Dialog>
    </>
  );
}

const freshNoteId = (notes: readonly { readonly id: string }[]): string => {
  let n = notes.length + 1;
  while (notes.some((note) => note.id === `n${n}`)) n++;
  return `n${n}`;
};
