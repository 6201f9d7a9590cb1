import { findingsOf } from '@/geometry/findings/catalogue';
import type { FindingCode } from '@/geometry/findings/codes';
import type { FindingContext } from '@/geometry/findings/context';
import type { Finding, Severity } from '@/geometry/findings/types';

/** A rule's own proof: what raises it, what lies just inside its limit, and what it says. */
export interface RuleCase {
  readonly severity: Severity;
  readonly raises: () => FindingContext;
  /** Just inside the limit: the same kitchen with one number on the other side. */
  readonly spares: () => FindingContext;
  /** Parts of the sentence: the number, the limit. */
  readonly says: readonly string[];
  /** Another number past the limit: the sentence has to change with it. Left out where the fact has no number. */
  readonly other?: () => FindingContext;
}

export type RuleCases = Partial<Record<FindingCode, RuleCase>>;

export const found = (context: FindingContext, code: FindingCode): readonly Finding[] =>
  findingsOf(context).filter((finding) => finding.code === code);

/** Runs every case: raised with its severity and words, not raised inside the limit, reworded with another number. */
export function proveCases(cases: RuleCases): void {
  for (const [code, rule] of Object.entries(cases) as [FindingCode, RuleCase][]) {
    describe(code, () => {
      it(`is a ${rule.severity} and says ${rule.says.map((part) => `"${part}"`).join(', ')}`, () => {
        const [first] = found(rule.raises(), code);
        expect(first).toBeDefined();
        expect(first!.severity).toBe(rule.severity);
        for (const part of rule.says) expect(first!.text).toContain(part);
        expect(first!.action.length).toBeGreaterThan(5);
        expect(first!.source.length).toBeGreaterThan(3);
        expect(Object.values(first!.at).some((place) => place !== undefined)).toBe(true);
      });

      it('is silent just inside the limit', () => {
        expect(found(rule.spares(), code)).toEqual([]);
      });

      if (rule.other) {
        const other = rule.other;
        it('words the fact anew for another number', () => {
          const texts = [rule.raises(), other()].map((context) => found(context, code)[0]?.text);
          expect(texts[1]).toBeDefined();
          expect(texts[1]).not.toBe(texts[0]);
        });
      }
    });
  }
}
