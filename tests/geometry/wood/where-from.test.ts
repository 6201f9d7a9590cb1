import { WHERE_FROM } from '@/geometry/findings/where-from';
import { sourced, sourceText } from '@/geometry/wood/sourced';
import { countByStanding } from '@/geometry/wood/where-from';

describe('WHERE_FROM', () => {
  it('names every constant once', () => {
    expect(new Set(WHERE_FROM.map((c) => c.name)).size).toBe(WHERE_FROM.length);
  });

  it('gives a document for whatever is published, second hand or computed', () => {
    for (const { standing, source } of WHERE_FROM) {
      const documented = standing === 'published' || standing === 'second hand' || standing === 'computed';
      expect(!documented || source.length > 5).toBe(true);
    }
  });

  it('counts what is weaker than a document, each under its own standing', () => {
    const count = countByStanding(WHERE_FROM);
    expect(Object.values(count).reduce((a, b) => a + b, 0)).toBe(WHERE_FROM.length);
    expect(count['from memory']).toBe(WHERE_FROM.filter((c) => c.standing === 'from memory').length);
    expect(count['from memory'] + count['common practice'] + count['our choice']).toBeGreaterThan(100);
  });
});

describe('sourceText', () => {
  it('prints a document by its name and anything weaker by its standing first', () => {
    expect(sourceText(sourced(51, 'published', 'NIOSH, p. 7'))).toBe('NIOSH, p. 7');
    expect(sourceText(sourced(3, 'common practice', ''))).toBe('common practice');
    expect(sourceText(sourced(10, 'from memory', 'yellow glue'))).toBe('from memory: yellow glue');
  });
});
