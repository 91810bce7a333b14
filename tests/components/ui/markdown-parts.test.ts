import { placeParts, type MarkNode } from '@/components/ui/markdown-parts';

const text = (value: string): MarkNode => ({ type: 'text', value });
const element = (tagName: string, ...children: MarkNode[]): MarkNode => ({
  type: 'element',
  tagName,
  children,
});
const root = (...children: MarkNode[]): MarkNode => ({ type: 'root', children });
/** Finds residue names of family c. */
const linkify = (words: string) =>
  words
    .split(/(\bc[A-Z]\d+\b)/)
    .filter((part) => part !== '')
    .map((part) => (/^c[A-Z]\d+$/.test(part) ? { plate: part } : part));

const flat = (node: MarkNode): string =>
  node.properties?.dataPart !== undefined
    ? `[${String(node.properties.dataPart)}]`
    : (node.value ?? '') + (node.children ?? []).map(flat).join('');

test('residue names in a text become numbered places, in order, also within other marks', () => {
  const tree = root(element('p', text('from cE59 to '), element('strong', text('cD61')), text('.')));
  expect(placeParts(tree, linkify)).toEqual([{ plate: 'cE59' }, { plate: 'cD61' }]);
  expect(flat(tree)).toBe('from [0] to [1].');
});

test('code, preformatted text and links stay as they were written', () => {
  const tree = root(
    element('p', element('code', text('cE59')), element('a', element('em', text('cE59')))),
    element('pre', element('code', text('cE59'))),
  );
  expect(placeParts(tree, linkify)).toEqual([]);
  expect(flat(tree)).toBe('cE59cE59cE59');
});
