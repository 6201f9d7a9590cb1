import type { NestInstance, NestPlan } from '@/geometry/nest/types';
import type { NestFinding } from './finding';

/** Cost, gap and the claim of proof agree with each other and with the prices. */
export function checkMoney(instance: NestInstance, plan: NestPlan): NestFinding[] {
  const found: NestFinding[] = [];
  const price = new Map(instance.stock.map((s) => [s.id, s.price]));
  const cost = plan.slabs.reduce((sum, s) => sum + (price.get(s.stock) ?? 0), 0);
  if (cost !== plan.cost)
    found.push({ code: 'cost_wrong', text: `The slabs cost ${cost} cents and the plan says ${plan.cost}.` });
  if (plan.lowerBound > plan.cost)
    found.push({
      code: 'bound_above_cost',
      text: `The lower bound ${plan.lowerBound} is above the cost ${plan.cost}.`,
    });
  const gap = plan.cost === plan.lowerBound ? 0 : (plan.cost - plan.lowerBound) / plan.lowerBound;
  if (!(Math.abs(gap - plan.gap) < 1e-9) && gap !== plan.gap)
    found.push({ code: 'gap_wrong', text: `The gap is ${gap} and the plan says ${plan.gap}.` });
  if (plan.proved !== (plan.cost === plan.lowerBound))
    found.push({
      code: 'proved_wrong',
      text: `The plan is ${plan.proved ? '' : 'not '}called proved with cost ${plan.cost} and bound ${plan.lowerBound}.`,
    });
  return found;
}
