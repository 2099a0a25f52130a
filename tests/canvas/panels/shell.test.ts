import { describe, expect, it } from 'vitest';
import { partsOf } from '../../../canvas/panels/mailbox/partsOf';
import { barPartOf, partOf, partsInBar, siteParts } from '../../../canvas/panels/shell/parts';
import { outlinePath } from '../../../canvas/panels/sites/outlinePath';
import { feet, type Ticks } from '../../../model/length/ticks';
import type { PlanPoint } from '../../../model/geometry/point';

describe('the parts of a site', () => {
  it('are found from the path', () => {
    expect(partOf('/sites/1f/plan')).toBe('plan');
    expect(partOf('/sites/1f/revisions/compare')).toBe('revisions');
    expect(partOf('/sites/1f/revisions/3')).toBe('revisions');
    expect(partOf('/sites/1f')).toBeNull();
    expect(partOf('/sites/1f/nothing')).toBeNull();
    expect(partOf('/')).toBeNull();
  });

  it('light More in the bar where they have no place of their own', () => {
    expect(partsInBar().map(({ part }) => part)).toEqual(['plan', 'elevation', 'poles', 'levels', 'more']);
    for (const { part } of siteParts) {
      expect(barPartOf(part)).toBe(['takeoff', 'revisions', 'crew'].includes(part) ? 'more' : part);
    }
    expect(barPartOf(null)).toBeNull();
  });
});

function rectangle(x: number, y: number, width: number, depth: number): PlanPoint[] {
  const at = (px: number, py: number) => ({ x: feet(px) as Ticks, y: feet(py) as Ticks });
  return [at(x, y), at(x + width, y), at(x + width, y + depth), at(x, y + depth)];
}

describe('the small picture of a site', () => {
  // 24 ft over the 74 px inside a 13 % margin of 100: the depth of 12 ft takes 37 px, in the middle, y upside down.
  it('fits the outline into its square', () => {
    expect(outlinePath([rectangle(0, 0, 24, 12)], 100)).toBe('M13 68.5L87 68.5L87 31.5L13 31.5Z');
  });

  it('does not depend on where the building stands or how large it is', () => {
    const path = outlinePath([rectangle(0, 0, 24, 12)], 76);
    expect(outlinePath([rectangle(-400, 1000, 24, 12)], 76)).toBe(path);
    expect(outlinePath([rectangle(3, 5, 240, 120)], 76)).toBe(path);
  });

  it('draws nothing where there are no walls, or only a point', () => {
    expect(outlinePath([], 76)).toBeNull();
    expect(outlinePath([[]], 76)).toBeNull();
    expect(outlinePath([rectangle(2, 2, 0, 0)], 76)).toBeNull();
  });
});

describe('a mail in the local mailbox', () => {
  it('is cut at its links, in order', () => {
    const text = 'Open http://localhost:4600/invitation/abc today, or http://localhost:4600/ later.';
    expect(partsOf(text, ['http://localhost:4600/invitation/abc', 'http://localhost:4600/'])).toEqual([
      { text: 'Open ', link: false },
      { text: 'http://localhost:4600/invitation/abc', link: true },
      { text: ' today, or ', link: false },
      { text: 'http://localhost:4600/', link: true },
      { text: ' later.', link: false },
    ]);
  });

  it('never makes a link of a script, nor of what is not in the text', () => {
    const text = 'Press javascript:alert(1) now';
    expect(partsOf(text, ['javascript:alert(1)', 'https://elsewhere.example/'])).toEqual([{ text, link: false }]);
  });
});
