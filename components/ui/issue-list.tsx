import CircleX from 'lucide-react-native/icons/circle-x';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { color, face } from '@/components/theme';
import { Icon } from './icon';

/** One thing wrong or doubtful, as it is read to a person. Line and column count from 1. */
export interface IssueView {
  key: string;
  severity: 'error' | 'warning';
  line?: number;
  column?: number;
  /** What is there and what is wrong with it. */
  sentence: string;
  /** What to do about it. */
  advice?: string;
}

export interface IssueRowProps {
  issue: IssueView;
  selected?: boolean;
  /** Shows the file's text at that place. */
  onOpen?: () => void;
}

/** `212:9`, `212`, or nothing when the issue belongs to the whole file. */
export function issuePlace(issue: Pick<IssueView, 'line' | 'column'>): string {
  if (issue.line === undefined) return '';
  return issue.column === undefined ? String(issue.line) : `${issue.line}:${issue.column}`;
}

export function IssueRow({ issue, selected, onOpen }: IssueRowProps) {
  const isError = issue.severity === 'error';
  const tone = isError ? 'danger' : 'warn';
  const content = (
    <>
      <span style={{ display: 'inline-flex', gap: 5, alignItems: 'center', alignSelf: 'start' }}>
        <Icon of={isError ? CircleX : TriangleAlert} tone={tone} sizePixels={16} />
        <span style={{ font: `600 12px/20px ${face.text}`, color: isError ? color.danger : color.warn }}>
          {issue.severity}
        </span>
      </span>
      <span style={{ font: `400 14px/20px ${face.mono}` }}>{issuePlace(issue)}</span>
      <span style={{ minWidth: 0, overflowWrap: 'anywhere' }}>
        {issue.sentence}
        {issue.advice ? <span style={{ display: 'block', color: color.inkSoft }}>{issue.advice}</span> : null}
      </span>
    </>
  );
  const style = {
    display: 'grid',
    gridTemplateColumns: '74px minmax(44px,auto) minmax(0,1fr)',
    gap: '2px 10px',
    width: '100%',
    minHeight: 'var(--hit)',
    padding: '10px 8px',
    color: color.ink,
    font: `400 14px/20px ${face.text}`,
    background: selected ? color.accentSoft : undefined,
    boxShadow: selected ? `inset 3px 0 0 ${color.accent}` : undefined,
  } as const;
  if (!onOpen) return <div style={style}>{content}</div>;
  return (
    <button
      type="button"
      style={style}
      className="press"
      aria-current={selected ? 'true' : undefined}
      onClick={onOpen}
    >
      {content}
    </button>
  );
}

export interface IssueListProps {
  issues: readonly IssueView[];
  label: string;
  selectedKey?: string;
  onOpen?: (issue: IssueView) => void;
}

export function IssueList({ issues, label, selectedKey, onOpen }: IssueListProps) {
  return (
    <ul aria-label={label}>
      {issues.map((issue, place) => (
        <li key={issue.key} style={{ borderTop: place === 0 ? undefined : `1px solid ${color.lineHair}` }}>
          <IssueRow
            issue={issue}
            selected={issue.key === selectedKey}
            onOpen={onOpen && (() => onOpen(issue))}
          />
        </li>
      ))}
    </ul>
  );
}
