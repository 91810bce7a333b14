/*
 * The frame of the product.
 *   AppShell    places[{ key, label, icon, href, badge? }] currentPlace? homeHref project?{ name, detail?, href? } locator? people?
 *               railFoot? phoneEnd? notice? standing? children. Once, around all screens of a project (an outlet that keeps only the
 *               present screen mounted).
 *   Screen      title backHref? phoneTools? items?[{ key, label, value }] saved? actions? kind? page or panes, narrow?
 *               children. Once in every screen: fills top bar, strip or title block, and the action bar of a phone.
 *   Panes       name panes[{ key, label, content, widthPixels?, flat?, hideWhenStacked? }], inside <Screen kind="panes">
 *   Pane        label flat? stacked?                          a named section
 *   PageTitle   children detail? action? large? quietOnPhone? (h1)
 *   TitleBlock, ContextStrip   items saved?                   for pages without a frame, for example shared ones
 *   EntryFrame  aside? children                               before a project is open
 */
export { AppShell, type AppShellProps, type ProjectName } from './app-shell';
export { Screen, type ScreenProps } from './screen';
export { Panes, type PanesProps } from './panes';
export { Pane, type PaneProps } from './pane';
export { planPanes, type PaneItem, type PanePlan } from './pane-plan';
export { PageTitle, type PageTitleProps } from './page-title';
export { TitleBlock, ContextStrip, type TitleBlockProps, type TitleItem } from './title-block';
export { EntryFrame, type EntryFrameProps } from './entry-frame';
export { type Place } from './place';
