import type { EditDraft } from '@/shared/layout/apply-edit';
import type { Section } from '@/shared/layout/edit-job';
import { useOpenJob } from '../editor/JobProvider';

/**
 * Changes fields of one item of the layout; null takes an optional field away.
 *
 * @returns a function of the fields and of what to call the change in undo: "25 in deep"
 */
export function useItemChange(section: Section, item: string, name: string) {
  const { run } = useOpenJob();
  return (change: Readonly<Record<string, unknown>>, what: string): boolean =>
    run({ kind: 'changeItem', section, item, change } as EditDraft, `${name}, ${what}`);
}
