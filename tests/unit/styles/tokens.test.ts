import { readdirSync, readFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { describe, expect, it } from 'vitest';

const source = resolve(import.meta.dirname, '../../../src');
const css = readFileSync(join(source, 'styles/tokens.css'), 'utf8');
const TOKENS = Object.fromEntries(
  [...css.matchAll(/--(\w+): light-dark\((#\w{6}), (#\w{6})\);/g)].map(([, name, light, dark]) => [
    name,
    { light, dark },
  ]),
) as Record<string, { light: string; dark: string }>;

// WCAG 2.2, "relative luminance" and "contrast ratio".
function contrast(a: string, b: string): number {
  const luminance = (colour: string) => {
    const [r, g, b] = [1, 3, 5].map((at) => {
      const value = parseInt(colour.slice(at, at + 2), 16) / 255;
      return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!;
  };
  const [high, low] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high! + 0.05) / (low! + 0.05);
}

const SCHEMES = ['light', 'dark'] as const;
const GROUNDS = ['paper', 'sheet', 'tint'] as const;

describe('tokens', () => {
  it('computes contrast as WCAG does (its own example: black on white is 21)', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 10);
  });

  it('reads them all', () => {
    expect(Object.keys(TOKENS)).toEqual(expect.arrayContaining([...GROUNDS, 'ink', 'soft', 'marram', 'rust', 'gorse']));
    expect(Object.keys(TOKENS)).toHaveLength(15);
  });

  it('can be read as text on every ground: 4.5 to 1 (WCAG 1.4.3)', () => {
    const weak = SCHEMES.flatMap((scheme) =>
      ['ink', 'soft', 'marram', 'dune', 'tide', 'kelp', 'heather', 'rust'].flatMap((text) =>
        GROUNDS.filter((ground) => contrast(TOKENS[text]![scheme], TOKENS[ground]![scheme]) < 4.5).map(
          (ground) => `${scheme} ${text} on ${ground}`,
        ),
      ),
    );
    expect(weak).toEqual([]);
  });

  it('can be seen as an edge of a control on every ground: 3 to 1 (WCAG 1.4.11)', () => {
    const weak = SCHEMES.flatMap((scheme) =>
      GROUNDS.filter((ground) => contrast(TOKENS['edge']![scheme], TOKENS[ground]![scheme]) < 3).map(
        (ground) => `${scheme} ${ground}`,
      ),
    );
    expect(weak).toEqual([]);
  });

  it('gives a browser without light-dark() the same light colours', () => {
    const plain = css.slice(css.indexOf('@supports not'));
    for (const [name, { light }] of Object.entries(TOKENS)) expect(plain).toContain(`--${name}: ${light};`);
  });

  it('spells colours nowhere else', () => {
    const files = readdirSync(source, { recursive: true, encoding: 'utf8' }).filter(
      (name) => /\.(astro|tsx|ts|css)$/.test(name) && !name.startsWith('styles'),
    );
    expect(files.length).toBeGreaterThan(50);
    const spelled = files.filter((name) =>
      /["'`:\s(]#(?:[0-9a-f]{6}|[0-9a-f]{3})["'`;\s)]|\b(?:rgba?|hsla?|oklch)\(/i.test(
        readFileSync(join(source, name), 'utf8'),
      ),
    );
    expect(spelled).toEqual([]);
  });
});
