import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { themes, type ColorName, type ThemeName } from '@/components/theme/tokens';

/** Relative luminance of WCAG 2. */
function luminance(hex: string): number {
  const channel = (at: number) => {
    const share = parseInt(hex.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

function contrast(one: string, other: string): number {
  const [low, high] = [luminance(one), luminance(other)].sort((a, b) => a - b) as [number, number];
  return (high + 0.05) / (low + 0.05);
}

const PAIRS: readonly (readonly [ColorName, ColorName, number])[] = [
  ['ink', 'paper', 7],
  ['ink2', 'paper', 7],
  ['ink2', 'tone', 7],
  ['ink2', 'field', 7],
  ['onRed', 'red', 7],
  ['redText', 'paper', 7],
  ['ink', 'redTone', 7],
  ['ink2', 'redTone', 4.5],
  ['blue', 'paper', 4.5],
  ['blue', 'field', 4.5],
  ['blue', 'redTone', 4.5],
  ['onBlue', 'blue', 7],
  ['onYellow', 'yellow', 7],
  ['onGreen', 'green', 7],
  ['green', 'paper', 3],
  ['zRed', 'paper', 3],
  ['zOrange', 'paper', 3],
];

describe.each(Object.keys(themes) as ThemeName[])('the %s theme', (name) => {
  it.each(PAIRS)('%s on %s reaches %d to 1', (front, ground, least) => {
    expect(contrast(themes[name][front], themes[name][ground])).toBeGreaterThanOrEqual(least);
  });
});

describe('base.css', () => {
  const css = readFileSync(path.join(import.meta.dirname, '../../../public/base.css'), 'utf8');
  const selectors: Readonly<Record<ThemeName, RegExp>> = {
    light: /^:root \{([^}]*)\}/m,
    dark: /:root\[data-theme='dark'\] \{([^}]*)\}/,
    sunlight: /:root\[data-theme='sunlight'\] \{([^}]*)\}/,
  };

  it.each(Object.keys(themes) as ThemeName[])('has the colours of the %s theme', (name) => {
    const block = selectors[name].exec(css)?.[1] ?? '';
    for (const token of ['paper', 'ink', 'blue'] as const) {
      expect(block).toContain(`--${token}: ${themes[name][token].toLowerCase()};`);
    }
  });

  it('follows the device in the same colours as the dark theme', () => {
    const block = /:root:not\(\[data-theme\]\) \{([^}]*)\}/.exec(css)?.[1] ?? '';
    expect(block).toContain(`--paper: ${themes.dark.paper.toLowerCase()};`);
  });

  it('names only faces that are shipped', () => {
    const files = [...css.matchAll(/url\((\/fonts\/[^)]+)\)/g)].map((match) => match[1] ?? '');
    expect(files).toHaveLength(4);
    for (const file of files) {
      expect(
        readFileSync(path.join(import.meta.dirname, '../../../public', file))
          .subarray(0, 4)
          .toString(),
      ).toBe('wOF2');
    }
  });
});
