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
 *   Banner       kind? note warn danger good, action? announce?     Mark  tone? icon?    Toast  onUndo?
 *   IssueList    issues[{ key, severity, line?, column?, sentence, advice? }] label selectedKey? onOpen?
 *   StageScale   stage share? state? sentence? stages? label?
 *   Empty        title children action?                      Loading  children: what is being read
 *   ReadView     of: a data hook's answer, what, children(value)   NothingHere  action?
 *   Person       name presence?                              Status   status
 *   CheckList    checks[{ result, name, value?, limit? }] label      Tally  cells[{ key, count, word, tone? }] label
 *   List         label rows keyOf children(row)              ListRow  lead? title detail? end? href? onPress? selected?
 *   Table        caption columns[{ key, header, cell, numeric?, rowHeader?, sorted?, onSort? }] rows keyOf selectedKey?
 *   KeyValueList of KeyValueRow name value mono? strong?
 *   BothTexts    sentence rows[{ key, name, theirs, mine }] onTakeTheirs onKeepMine busyText?   (after a conflict)
 *   Dialog       open title onClose actions?                 Sheet  open title onClose
 *   Key, Time iso form?, Markdown text linkify?, Logo
 *   counted, countWords                                      `3 copies`, `no copies`
 */
export { Text, type TextProps } from './text';
export { Stack, Row, type RowProps, type StackProps } from './stack';
export { Card } from './card';
export { Link, type LinkProps } from './link';
export { Icon, type IconProps, type IconShape } from './icon';
export { Button, type ButtonKind, type ButtonProps } from './button';
export { IconButton, type IconButtonProps } from './icon-button';
export { CopyButton, type CopyButtonProps } from './copy-button';
export { Caption, type CaptionProps } from './caption';
export { Tabs, type TabItem, type TabsProps } from './tabs';
export { Segment, type SegmentProps } from './segment';
export { Choice, type ChoiceOption, type ChoiceProps } from './choice';
export { Banner, type BannerKind, type BannerProps } from './banner';
export { BothTexts, type BothTextsProps } from './both-texts';
export { Mark, type MarkProps } from './mark';
export { Toast, type ToastProps } from './toast';
export {
  IssueList,
  IssueRow,
  issuePlace,
  type IssueListProps,
  type IssueRowProps,
  type IssueView,
} from './issue-list';
export { StageScale, stagePercent, uploadStages, type StageScaleProps } from './stage-scale';
export { counted, countWords } from './count-words';
export { Empty, type EmptyProps } from './empty';
export { Loading } from './loading';
export { NothingHere, ReadView, type ReadState, type ReadViewProps } from './read-view';
export { Person, initials, type PersonProps } from './person';
export { Status, type StatusName } from './status';
export { CheckList, CheckRow, type CheckResult, type CheckRowProps } from './check-row';
export { Tally, type TallyCell } from './tally';
export { List, ListRow, type ListProps, type ListRowProps } from './list';
export { Table, type TableColumn, type TableProps } from './table';
export { KeyValueList, KeyValueRow, type KeyValueRowProps } from './key-value';
export { Dialog, type DialogProps } from './dialog';
export { Sheet, type SheetProps } from './sheet';
export { Key } from './key';
export { Time, type TimeProps } from './time';
export { fullTimeWords, timeWords, type TimeForm } from './time-words';
export { Markdown, type MarkdownProps } from './markdown';
export type { Linkify } from './markdown-parts';
export { Logo } from './logo';
