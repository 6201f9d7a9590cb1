import { useLocalSearchParams, useRouter } from 'expo-router';

export const WORK_PARTS = [
  { value: 'steps', label: 'Order of work', subtitle: 'Order of work' },
  { value: 'wood', label: 'Wood', subtitle: 'Climate, movement and weight' },
  { value: 'hardware', label: 'Hardware', subtitle: 'Screws, connectors and support' },
  { value: 'finish', label: 'Finish', subtitle: 'Finish and care' },
  { value: 'from', label: 'Where from', subtitle: 'Where every figure is from' },
] as const;

export type WorkPartName = (typeof WORK_PARTS)[number]['value'];

/** The part of the page that is open, kept in the address, with the line of 'Where from' that was asked for. */
export function useWorkPart() {
  const router = useRouter();
  const params = useLocalSearchParams<{ part?: string; line?: string }>();
  const part = WORK_PARTS.find(({ value }) => value === params.part)?.value ?? 'steps';
  return {
    part,
    line: params.line ?? '',
    show: (next: WorkPartName) => router.setParams({ part: next, line: '' }),
    showLine: (line: string) => router.setParams({ part: 'from', line }),
  };
}
