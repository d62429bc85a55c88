import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { colours, type Colours } from '../../../components/ui/colours';

const file = (name: string) => readFileSync(join(__dirname, '../../../public', name), 'utf8');
const css = file('base.css');
const schemes = ['light', 'dark'] as const;

/** The custom properties of the first `:root` block after `start`. */
function rootColours(start: string): Record<string, string> {
  const block = /:root\s*\{([^}]*)\}/.exec(css.slice(css.indexOf(start)))?.[1] ?? '';
  return Object.fromEntries(
    [...block.matchAll(/--([a-z-]+):\s*(#[\da-f]{6});/gi)].map(([, name, value]) => [
      String(name),
      String(value).toUpperCase(),
    ]),
  );
}

const inCss = {
  light: rootColours(':root'),
  dark: rootColours('prefers-color-scheme: dark'),
} as const;

test.each(schemes)('base.css repeats the %s colours by name', (scheme) => {
  const names = Object.keys(inCss[scheme]);
  expect(names).toEqual(['page', 'ink', 'well']);
  for (const name of names) {
    expect([name, inCss[scheme][name]]).toEqual([name, colours[scheme][name as keyof Colours]]);
  }
});

test.each(schemes)('index.html tells the browser the %s page colour', (scheme) => {
  const found = new RegExp(`content="(#[^"]+)" media="\\(prefers-color-scheme: ${scheme}\\)"`).exec(
    file('index.html'),
  );
  expect(found?.[1]).toBe(colours[scheme].page);
});

test('the manifest opens on the light page', () => {
  const manifest = JSON.parse(file('manifest.webmanifest')) as Record<string, unknown>;
  expect(manifest.background_color).toBe(colours.light.page);
  expect(manifest.theme_color).toBe(colours.light.page);
});

test('the mark has ink and water of each scheme', () => {
  const used = [...file('icons/mark.svg').matchAll(/#[\da-f]{6}/gi)].map(([c]) => c.toUpperCase());
  const { light, dark } = colours;
  expect(used).toEqual([light.ink, light.well, dark.ink, dark.well]);
});

/** Relative luminance of an sRGB colour, WCAG 2.2. */
function luminance(hex: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const value = parseInt(hex.slice(at, at + 2), 16) / 255;
    return value <= 0.040_45 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

function contrast(one: string, other: string): number {
  const [dark = 0, light = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (light + 0.05) / (dark + 0.05);
}

const text = ['ink', 'inkSoft', 'well', 'clay', 'good', 'warn', 'bad'] as const;
const surfaces = ['page', 'raised'] as const;

test.each(schemes)(
  'text in every %s tone reads on page and raised: 4.5 to 1 (WCAG 1.4.3)',
  (scheme) => {
    const c = colours[scheme];
    for (const tone of text) {
      for (const surface of surfaces) {
        expect([tone, surface, contrast(c[tone], c[surface]) >= 4.5]).toEqual([
          tone,
          surface,
          true,
        ]);
      }
    }
    expect(contrast(c.onWell, c.well)).toBeGreaterThanOrEqual(4.5);
  },
);

test.each(schemes)('the %s border of a control stands out: 3 to 1 (WCAG 1.4.11)', (scheme) => {
  const c = colours[scheme];
  for (const surface of surfaces) expect(contrast(c.edge, c[surface])).toBeGreaterThanOrEqual(3);
});
