import { layoutForWidth } from '@/components/theme/use-layout';
import { chooseTheme } from '@/components/theme/use-theme';

jest.mock('react-native', () => ({ useWindowDimensions: () => ({ width: 0, height: 0 }) }));

test.each([
  [360, 'phone'],
  [699, 'phone'],
  [700, 'two'],
  [999, 'two'],
  [1000, 'wide'],
  [1279, 'wide'],
  [1280, 'three'],
])('a window of %i pixels is laid out as %s', (width, name) => {
  expect(layoutForWidth(width)).toBe(name);
});

test('the theme once chosen wins over the system, and nonsense in storage counts as no choice', () => {
  expect(chooseTheme('light', true)).toBe('light');
  expect(chooseTheme('dark', false)).toBe('dark');
  expect(chooseTheme(null, true)).toBe('dark');
  expect(chooseTheme('purple', false)).toBe('light');
});
