import { describe, expect, it } from 'vitest';
import { themes, toneColour, type Tone } from '../../../canvas/ui/tokens';

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
function luminance(hex: string): number {
  const [r, g, b] = [1, 3, 5].map((at) => {
    const part = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  }) as [number, number, number];
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(a: string, b: string): number {
  const [light, dark] = [luminance(a), luminance(b)].sort((x, y) => y - x) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

const onPaper: readonly Tone[] = ['ink', 'soft', 'accent', 'caution', 'level', 'line', 'frame'];

describe.each(['light', 'sun'] as const)('the %s theme', (name) => {
  const { colours, strokes } = themes[name];

  it('measures black on white as WCAG does', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 10);
  });

  it.each(onPaper)('sets words in %s at 4.5 to 1 or more on every ground (WCAG 2.2, 1.4.3 AA)', (tone) => {
    for (const ground of [colours.ground, colours.surface, colours.selected, colours.hover, colours.cautionTint]) {
      // Frame green is for labels on the drawing's own grounds.
      if (tone === 'frame' && ground !== colours.ground && ground !== colours.surface) continue;
      expect(contrast(toneColour(colours, tone), ground)).toBeGreaterThanOrEqual(4.5);
    }
  });

  it('sets words on filled buttons and tags at 4.5 to 1 or more', () => {
    expect(contrast(colours.onEarthDeep, colours.earthDeep)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(colours.onEarthDeep, colours.earthPressed)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(colours.onEarthDeep, colours.caution)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(colours.onTag, colours.tag)).toBeGreaterThanOrEqual(4.5);
  });

  it('draws the edges of controls and the focus ring at 3 to 1 or more (WCAG 2.2, 1.4.11 AA)', () => {
    for (const ground of [colours.ground, colours.surface]) {
      expect(contrast(colours.edge, ground)).toBeGreaterThanOrEqual(3);
      expect(contrast(colours.focus, ground)).toBeGreaterThanOrEqual(3);
      expect(contrast(colours.steel, ground)).toBeGreaterThanOrEqual(3);
    }
  });

  it('gives strokes in rising weight', () => {
    expect([strokes.hair, strokes.thin, strokes.normal, strokes.heavy]).toEqual(
      [strokes.hair, strokes.thin, strokes.normal, strokes.heavy].sort((a, b) => a - b),
    );
  });
});

it('draws heavier in the sun', () => {
  for (const weight of ['hair', 'thin', 'normal', 'heavy', 'icon'] as const) {
    expect(themes.sun.strokes[weight]).toBeGreaterThan(themes.light.strokes[weight]);
  }
});
