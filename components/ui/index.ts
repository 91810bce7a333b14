/*
 * The parts that every screen is made of. Plain data in, events out.
 *   Text         kind? tone? strong? italic? mono? struck? align? heading? role? id? lines? style?
 *   Stack, Row   gap? (Row: wrap? align? justify?)           Card  sunken?
 *   Link         href label? className? style? current? replace?     in the product, outside, and downloads under /api/
 *   Icon         of sizePixels? tone? label?                 of: from lucide-react-native/icons/<name>
 *   Button       kind? icon? onPress? href? submit? offReason? busyText? full? label?     children: a verb
 *   IconButton   icon label onPress? href? on? expanded?     CopyButton text label?
 *   Caption      children count? action? level?              (h2)
 *   Tabs         items[{ key, label, count? }] current onChange label panelId?
 *   Segment      options[{ value, label }] value onChange label
 *   Choice       options[{ value, title, consequence?, offReason? }] value onChange label
 *   Banner       kind? note warn danger good, action? announce?     Mark  tone? icon?
 *   IssueList    issues[{ key, severity, line?, column?, sentence, advice? }] label selectedKey? onOpen?
 *   StageScale   stage share? state? sentence? stages? label?
 *   Empty        title children action?                      Loading  children: what is being read
 *   ReadView     of: a data hook's answer, what, children(value)   NothingHere  action?
 *   Person       name presence?                              Status   status
 *   CheckList    checks[{ result, name, value?, limit? }] label
 *   List         label rows keyOf children(row)              ListRow  lead? title detail? end? href? onPress? selected?
 *   Table        caption columns[{ key, header, cell, numeric?, rowHeader?, sorted?, onSort? }] rows keyOf selectedKey?
 *   KeyValueList of KeyValueRow name value mono? strong?
 *   BothTexts    sentence rows[{ key, name, theirs, mine }] onTakeTheirs onKeepMine busyText?   (after a conflict)
 *   Dialog       open title onClose actions?                 Sheet  open title onClose
 *   Key, Time iso form?, Markdown text linkify?, Logo
 *   counted, countWords                                      `3 copies`, `no copies`
 */
export { Text } from './text';
export { Stack, Row } from './stack';
export { Card } from './card';
export { Link } from './link';
export { Icon, type IconShape } from './icon';
export { Button, type ButtonKind } from './button';
export { IconButton } from './icon-button';
export { CopyButton } from './copy-button';
export { Caption } from './caption';
export { Tabs } from './tabs';
export { Segment } from './segment';
export { Choice, type ChoiceOption, type ChoiceProps } from './choice';
export { Banner } from './banner';
export { BothTexts } from './both-texts';
export { Mark } from './mark';
export { IssueList, type IssueView } from './issue-list';
export { StageScale } from './stage-scale';
export { counted, countWords } from './count-words';
export { Empty } from './empty';
export { Loading } from './loading';
export { NothingHere, ReadView, type ReadState } from './read-view';
export { Person } from './person';
export { Status } from './status';
export { CheckList } from './check-row';
export { List, ListRow } from './list';
export { Table, type TableColumn } from './table';
export { KeyValueList, KeyValueRow } from './key-value';
export { Dialog } from './dialog';
export { Sheet } from './sheet';
export { Key } from './key';
export { Time } from './time';
export { Markdown } from './markdown';
export type { Linkify } from './markdown-parts';
export { Logo } from './logo';
