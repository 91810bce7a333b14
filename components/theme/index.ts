/*
 * The look in names.
 *   color, toneColor, partColor(part), conservationColor(step), lift, space, radius, layer, measure
 *   typeScale, face            kinds of text: meta small body lead head title plate
 *   useLayout()                { name: phone | two | wide | three, hasRail, widthPixels }
 *   useTheme()                 { theme, setTheme, toggleTheme }; themeStorageKey for the page's first script
 */
export * from './tokens';
export * from './type';
export { useLayout, layoutForWidth, type Layout, type LayoutName } from './use-layout';
export { useTheme, applyTheme, chooseTheme, themeStorageKey, type ThemeName } from './use-theme';
