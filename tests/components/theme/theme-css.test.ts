// The style sheet says each colour twice removed from the design: this holds it to the design's own values.
import { readFileSync } from 'node:fs';
import path from 'node:path';
import tokens from '@/components/theme/tokens.json';
import { color, conservationColor, lift, partColor } from '@/components/theme/tokens';

const css = readFileSync(path.resolve(__dirname, '../../../public/theme.css'), 'utf8');
type Mode = 'light' | 'dark';

/** The declarations of the first rule with this selector. */
function variablesOf(selector: string): Map<string, string> {
  const start = css.indexOf(selector);
  if (start < 0) throw new Error(`no rule ${selector}`);
  const body = css.slice(css.indexOf('{', start) + 1, css.indexOf('}', start));
  const found = new Map<string, string>();
  for (const [, name, value] of body.matchAll(/--([\w-]+):\s*([^;]+);/g)) {
    if (name && value) found.set(name, value.replace(/\s+/g, ' ').trim().toLowerCase());
  }
  return found;
}

const plain = (group: string, entries: Record<string, string>): [string, string][] =>
  Object.entries(entries).map(([name, value]) => [group ? `${group}-${name}` : name, value]);
const named = (group: string, entries: Record<string, string>, bare: string): [string, string][] =>
  Object.entries(entries).map(([name, value]) => [name === bare ? group : `${group}-${name}`, value]);

/** What the style sheet must declare for a mode, from the design's tokens. */
function expectedVariables(mode: Mode): [string, string][] {
  const colors = tokens.color[mode];
  return [
    ...plain('', colors.ground),
    ...plain('line', colors.line),
    ...named('ink', colors.ink, 'ink'),
    ...named('accent', colors.accent, 'strong'),
    ...Object.entries(colors.status).flatMap(([name, entry]) => named(name, entry, 'strong')),
    ...Object.entries(colors.part).flatMap(([name, entry]) => named(`part-${name}`, entry, 'strong')),
    ...Object.entries(colors.state).flatMap(([name, entry]) => plain(`state-${name}`, entry)),
    ...plain('chem', colors.chem),
    ...colors.conservation.map((value, step): [string, string] => [`conservation-${step}`, value]),
    ...plain('atom', colors.atom),
    ...plain('lift', tokens.elevation[mode]),
  ];
}

test.each<[Mode, string]>([
  ['light', ":root,\n[data-theme='light']"],
  ['dark', "[data-theme='dark']"],
])(
  'the %s colours of the style sheet are those of the design, all of them and no others',
  (mode, selector) => {
    const found = variablesOf(selector);
    const expected = new Map(expectedVariables(mode).map(([name, value]) => [name, value.toLowerCase()]));
    expect(Object.fromEntries(found)).toEqual(Object.fromEntries(expected));
  },
);

test('every colour that components name is declared in both themes', () => {
  const parts = (['rotor', 'stator', 'head', 'stalk', 'other'] as const).flatMap((part) =>
    Object.values(partColor(part)),
  );
  const inks = ([0, 1, 2, 3, 4] as const).map(conservationColor);
  const used = [...Object.values(color), ...parts, ...inks, ...Object.values(lift)].filter((value) =>
    value.startsWith('var('),
  );
  const light = variablesOf(":root,\n[data-theme='light']");
  const dark = variablesOf("[data-theme='dark']");
  expect(used.length).toBeGreaterThan(40);
  for (const value of used) {
    const name = value.slice('var(--'.length, -1);
    expect([name, light.has(name), dark.has(name)]).toEqual([name, true, true]);
  }
});

/** WCAG 2.2, relative luminance and contrast ratio. */
function contrast(first: string, second: string): number {
  const luminance = (hex: string): number => {
    const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((at) => {
      const share = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
      return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
  };
  const [low, high] = [luminance(first), luminance(second)].sort((a, b) => a - b);
  return ((high ?? 0) + 0.05) / ((low ?? 0) + 0.05);
}

test.each<Mode>(['light', 'dark'])('words stand out by at least 4.5, marks by at least 3 (%s)', (mode) => {
  const { ground, ink, accent, status, part, line } = tokens.color[mode];
  const words = [ink.ink, ink.soft, ink.faint, accent.strong, ...Object.values(status).map((s) => s.strong)];
  for (const word of words) {
    for (const under of [ground.paper, ground.raised])
      expect(contrast(word, under)).toBeGreaterThanOrEqual(4.5);
  }
  for (const mark of [line.control, line.focus, ...Object.values(part).map((p) => p.strong)]) {
    expect(contrast(mark, ground.raised)).toBeGreaterThanOrEqual(3);
  }
  for (const pair of [accent, ...Object.values(status)]) {
    expect(contrast(pair.on, pair.strong)).toBeGreaterThanOrEqual(4.5);
  }
});

test('Greek letters come from faces of their own, the mono one sized to the same advance', () => {
  const faces = css
    .split('@font-face')
    .slice(1)
    .map((block) => block.slice(0, block.indexOf('}')));
  const greek = faces.filter(
    (block) => block.includes('U+0370-03FF'.toLowerCase()) || block.includes('U+0370-03FF'),
  );
  expect(greek).toHaveLength(4);
  const mono = greek.filter((block) => block.includes('noto-sans-mono-greek'));
  expect(mono).toHaveLength(2);
  for (const block of mono) expect(block).toContain(`size-adjust: ${tokens.font.greekSizeAdjust}`);
});
