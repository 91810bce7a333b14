/*
 * The frame of the product.
 *   AppShell    places[{ key, label, icon, href, badge? }] currentPlace? homeHref project?{ name, detail?, href? } locator? people?
 *               railFoot? phoneEnd? notice? standing? children. Once, around all screens of a project (an outlet that keeps only the
 *               present screen mounted).
 *   Screen      title backHref? phoneTools? items?[{ key, label, value }] saved? actions? kind? page or panes, narrow?
 *               children. Once in every screen: fills top bar, strip or title block, and the action bar of a phone.
 *   Panes       name panes[{ key, label, content, widthPixels?, flat?, hideWhenStacked? }], inside <Screen kind="panes">
 *   PageTitle   children detail? action? large? quietOnPhone? (h1)
 *   EntryFrame  aside? children                               before a project is open
 */
export { AppShell } from './app-shell';
export { Screen } from './screen';
export { Panes } from './panes';
export type { PaneItem } from './pane-plan';
export { PageTitle } from './page-title';
export { EntryFrame } from './entry-frame';
export type { Place } from './place';
