/*
 * The look in names.
 *   color, toneColor, partColor(part), conservationColor(step), lift, radius, layer, measure
 *   typeScale, face            kinds of text: meta small body lead head title plate
 *   useLayout()                { name: phone | two | wide | three, hasRail, widthPixels }
 *   useTheme()                 { theme, setTheme, toggleTheme }
 *   usePrinting()              true while the page is put on paper
 */
export * from './tokens';
export * from './type';
export { useLayout, type LayoutName } from './use-layout';
export { usePrinting } from './use-printing';
export { useTheme } from './use-theme';
