/*
 * The look in names.
 *   color, toneColor, partColor(part), conservationColor(step), lift, radius, layer, measure
 *   typeScale, face            kinds of text: meta small body lead head title plate
 *   useLayout()                { name: phone | two | wide | three, hasRail, widthPixels }
 *   useTheme()                 { theme, setTheme, toggleTheme }
 */
export * from './tokens';
export * from './type';
export { useLayout, type LayoutName } from './use-layout';
export { useTheme } from './use-theme';
