import type { NestInstance, NestPlan } from '@/geometry/nest/types';
import { checkCuts } from './check-cuts';
import { checkGroups } from './check-groups';
import { checkMoney } from './check-money';
import { checkPlaces } from './check-places';
import { checkSupply } from './check-supply';
import type { NestFinding } from './finding';
import { layParts } from './laid-part';

/**
 * Looks a plan over without trusting the program that made it, and sharing no code with it: parts and choices complete,
 * inside their slabs, clear of defects and a kerf apart, groups together, a saw sequence that frees every part, and sums
 * that add up. Run on every plan before a sheet is printed.
 *
 * @returns what is wrong; empty when the plan may be sawn
 */
export function checkPlan(instance: NestInstance, plan: NestPlan): NestFinding[] {
  const laid = layParts(instance, plan);
  const cuts = plan.slabs.flatMap((slab, i) => {
    const stock = instance.stock.find((s) => s.id === slab.stock);
    return stock ? checkCuts(instance, slab, stock, laid[i]!, i) : [];
  });
  return [
    ...checkSupply(instance, plan),
    ...checkPlaces(instance, plan, laid),
    ...checkGroups(instance, laid),
    ...cuts,
    ...checkMoney(instance, plan),
  ];
}
