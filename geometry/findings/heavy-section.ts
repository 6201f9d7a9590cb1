import { LIFT_CAUTION, teamCapacityLb } from '../wood/hands';
import { LIFTING, TEAM_LIFT } from '../wood/handbook';
import { sectionLoads, type SectionLoad } from '../wood/section-loads';
import type { Facts, Rule } from './facts';
import { finding } from './finding';
import type { Finding } from './types';
import { listText, pounds } from './words';

/** A section that needs more hands than the crew has, or more than three. */
export const heavySection: Rule = (facts) =>
  sectionLoads(facts.tops, facts.pieces)
    .filter(({ hands }) => hands.people > facts.layout.access.crew || hands.people === 4)
    .map((load) => heavy(facts, load));

function heavy(facts: Facts, { letters, weightLb, hands }: SectionLoad): Finding {
  const { crew } = facts.layout.access;
  const most = Math.min(Math.max(Math.floor(crew), 1), 3) as 1 | 2 | 3;
  const need = hands.people === 4 ? 'four people or a lifting aid' : `${hands.people} people`;
  return finding({
    code: 'heavy-section',
    severity: 'warn',
    text: `${listText(letters)} ${letters.length > 1 ? 'weigh' : 'weighs'} ${pounds(weightLb)} and ${letters.length > 1 ? 'need' : 'needs'} ${need}; the crew is ${crew}, and ${most} together lift ${pounds(teamCapacityLb(most))}. Lifting index ${hands.liftingIndex.toFixed(1)}.`,
    action: `${letters.length > 1 ? 'Join it on site, or bring' : 'Bring'} more hands or a lifting aid. ${LIFT_CAUTION}`,
    at: { pieces: letters },
    source: `${LIFTING}, p. 7; ${TEAM_LIFT}`,
  });
}
