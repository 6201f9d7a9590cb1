import type { IconName } from './icon-shapes';

/** One place to go to, in the rail, the bottom bar or the steps of a job. */
export interface NavItem {
  readonly key: string;
  readonly label: string;
  readonly icon: IconName;
  /** Address, for the router and for opening elsewhere. */
  readonly href: string;
  readonly current?: boolean;
  /** Must fix and look at together; 0 and undefined show nothing. */
  readonly count?: number;
}

/** What a screen reader hears: "Tops, 3 to look at". */
export const navWords = ({ label, count }: NavItem): string => (count ? `${label}, ${count} to look at` : label);
