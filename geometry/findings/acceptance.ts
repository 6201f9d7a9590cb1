import type { AcceptedFinding, Layout } from '../core/layout';
import type { Finding } from './types';

/** How a finding stands with those who may accept it. */
export type Acceptance =
  | { readonly state: 'open' }
  | { readonly state: 'accepted'; readonly accepted: AcceptedFinding }
  /** It was accepted with another number in it, and is open again. */
  | { readonly state: 'changed since'; readonly accepted: AcceptedFinding };

/** What must be fixed cannot be accepted; a finding whose sentence has changed since is open again. */
export function acceptanceOf({ accepted }: Pick<Layout, 'accepted'>, finding: Finding): Acceptance {
  const found = accepted[finding.key];
  if (!found || finding.severity === 'stop') return { state: 'open' };
  const same = found.text === undefined || found.text === finding.text;
  return { state: same ? 'accepted' : 'changed since', accepted: found };
}

/** Whether somebody still has to look at it. */
export const isOpen = (layout: Pick<Layout, 'accepted'>, finding: Finding): boolean =>
  acceptanceOf(layout, finding).state !== 'accepted';
