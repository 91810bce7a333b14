// What the web client leaves out of its packages: the list names files that are there, the stand-ins do for their parts.
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import path from 'node:path';
import { createElement, type ComponentType } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import leftOut from '../../metro.left-out.cjs';
import * as left from '../../stand-ins/left-out';
import { createNativeStackNavigator } from '../../stand-ins/native-stack';
import * as standIn from '../../stand-ins/svg';

const root = path.resolve(__dirname, '../..');
const files = leftOut.flatMap((part) => part.files.map((file) => `${part.package}/${file}`));

test.each(leftOut)('$package: $standIn stands in, and says why ($reason)', ({ standIn: file, reason }) => {
  expect(existsSync(path.join(root, 'stand-ins', file))).toBe(true);
  expect(reason.length).toBeGreaterThan(20);
});

test('each file left out is there, and named once', () => {
  expect(files.filter((file) => !existsSync(path.join(root, 'node_modules', file)))).toEqual([]);
  expect(files.filter((file, index) => files.indexOf(file) !== index)).toEqual([]);
});

test('every stand-in stands in for something', () => {
  const used = new Set(leftOut.map((part) => part.standIn));
  expect(readdirSync(path.join(root, 'stand-ins')).filter((file) => !used.has(file))).toEqual([]);
});

test('what is left out says so when it is used, and not before', () => {
  const parts: Record<string, () => void> = left;
  const Part = parts.FlatList ?? (() => {});
  const element = createElement(Part as ComponentType);
  expect(() => renderToStaticMarkup(element)).toThrow(/leaves this part out/);
  const { Navigator } = createNativeStackNavigator();
  expect(() => Navigator()).toThrow(/metro\.left-out\.cjs/);
});

/** Every name that a source file imports from the package of drawings. */
const namesImported = (text: string): string[] =>
  [...text.matchAll(/import (\w+)?,? ?(?:\{([^}]*)\})? ?from 'react-native-svg'/g)].flatMap(([, , names]) =>
    (names ?? '').split(',').map((name) => name.trim()),
  );
const sourcesOf = (folder: string): string[] =>
  readdirSync(path.join(root, folder), { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.tsx'))
    .map((file) => readFileSync(path.join(root, folder, file), 'utf8'));

test('every element that a drawing or an icon asks for is there', () => {
  const sources = ['app', 'client', 'components', 'features'].flatMap(sourcesOf);
  const drawn = sources.flatMap(namesImported).filter((name) => name !== '');
  const icons = sources
    .flatMap((text) => [...text.matchAll(/'lucide-react-native\/icons\/([\w-]+)'/g)])
    .map(([, name]) =>
      readFileSync(path.join(root, `node_modules/lucide-react-native/dist/esm/icons/${name}.mjs`), 'utf8'),
    );
  const iconTags = icons.flatMap((text) => [...text.matchAll(/\["(\w+)", \{/g)].map(([, tag]) => tag ?? ''));
  expect(drawn.length).toBeGreaterThan(5);
  expect(iconTags.length).toBeGreaterThan(20);
  const asked = new Set([...drawn, ...iconTags.map((tag) => tag.charAt(0).toUpperCase() + tag.slice(1))]);
  expect([...asked].filter((name) => !(name in standIn))).toEqual([]);
});

describe('an element of the page is written as the package of drawings writes it', () => {
  const line = { stroke: 'currentColor', strokeWidth: 1.5, strokeLinecap: 'round', fill: 'none' };
  const cases: [name: string, props: object][] = [
    ['Circle', { cx: 8, cy: 8, r: 6.25, strokeDasharray: '2.6 2.3', ...line }],
    ['Ellipse', { cx: 8, cy: 8, rx: 2, ry: 4, ...line }],
    ['G', { opacity: 0.5, strokeLinejoin: 'round' }],
    ['Line', { x1: '0', x2: '100%', y1: 27, y2: 27, ...line }],
    ['Path', { d: 'M5.2 8.2l2 2 3.6-4', fillRule: 'evenodd', ...line }],
    ['Polygon', { points: '0,0 4,4 0,4', ...line }],
    ['Polyline', { points: '0,0 4,4 0,4', ...line }],
    ['Rect', { x: '3.2%', y: 2, width: 12, height: 8, rx: 4, ...line }],
    ['Svg', { width: 16, height: 16, viewBox: '0 0 16 16', 'aria-hidden': true }],
    ['Svg', { width: '100%', height: 40, role: 'img', 'aria-label': 'a chain of 80 residues' }],
  ];
  const drawing: object = jest.requireActual('react-native-svg/lib/commonjs/elements.web');
  const write = (parts: object, name: string, props: object): string => {
    const Part = (parts as Record<string, ComponentType<object>>)[name];
    if (Part === undefined) throw new Error(`no ${name}`);
    return renderToStaticMarkup(createElement(Part, props));
  };
  const attributes = (markup: string): string[] => [
    markup.slice(1).split(/[ >]/)[0] ?? '',
    ...[...markup.matchAll(/ ([\w-]+="[^"]*")/g)].map(([, text]) => text ?? '').sort(),
  ];
  test.each(cases)('%s %j', (name, props) => {
    expect(attributes(write(standIn, name, props))).toEqual(attributes(write(drawing, name, props)));
  });
});
