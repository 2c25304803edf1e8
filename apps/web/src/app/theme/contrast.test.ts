import { describe, expect, it } from 'vitest';
import { displayModes, modeColours } from './modes';

/** Relative luminance and contrast ratio as WCAG 2.2 defines them (published: W3C, 2023). */
function luminance(hex: string): number {
  const channel = (from: number) => {
    const value = Number.parseInt(hex.slice(from, from + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}
function contrast(one: string, other: string): number {
  const [low, high] = [luminance(one), luminance(other)].sort((a, b) => a - b) as [number, number];
  return (high + 0.05) / (low + 0.05);
}

it('measures black on white as 21 to 1 (WCAG 2.2)', () => {
  expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 5);
});

describe.each(displayModes)('colours of %s', (mode) => {
  const colours = modeColours[mode];
  it('keeps text at 7 to 1 or more', () => {
    for (const ground of [colours.paper, colours.raised]) {
      for (const text of [colours.ink, colours.primary, colours.ember, colours.brass, colours.meltwater]) {
        expect(contrast(text, ground), `${text} on ${ground}`).toBeGreaterThanOrEqual(7);
      }
    }
    expect(contrast(colours.onPrimary, colours.primary)).toBeGreaterThanOrEqual(7);
    expect(contrast(colours.onEmber, colours.ember)).toBeGreaterThanOrEqual(7);
    expect(contrast(colours.ink, colours.frost)).toBeGreaterThanOrEqual(7);
  });
  it('keeps lines of controls at 4.5 to 1 or more', () => {
    expect(contrast(colours.line, colours.paper)).toBeGreaterThanOrEqual(4.5);
  });
});
