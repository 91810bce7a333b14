import type { CSSProperties, ReactNode } from 'react';
import { color, face } from '@/components/theme';
import { Link } from './link';

export interface ListRowProps {
  /** At the left: a plate, a family tag, a person. */
  lead?: ReactNode;
  title: ReactNode;
  detail?: ReactNode;
  /** At the right: a count, a mark, a select. */
  end?: ReactNode;
  /** Where the row leads. Rows that hold their own links or controls leave it out. */
  href?: string;
  onPress?: () => void;
  selected?: boolean;
  /** Spoken instead of the row's content. */
  label?: string;
}

const frame = (selected: boolean | undefined, hasLead: boolean, hasEnd: boolean): CSSProperties => ({
  display: 'grid',
  gridTemplateColumns: `${hasLead ? 'auto ' : ''}minmax(0,1fr)${hasEnd ? ' auto' : ''}`,
  gap: '2px 12px',
  alignItems: 'center',
  width: '100%',
  minHeight: 52,
  padding: selected ? '9px 12px' : '9px 0',
  color: color.ink,
  font: `400 14px/20px ${face.text}`,
  textDecoration: 'none',
  background: selected ? color.accentSoft : undefined,
  boxShadow: selected ? `inset 3px 0 0 ${color.accent}` : undefined,
  outlineOffset: -2,
});

/** One row of a list: what it is, one line more, and what stands at its end. */
export function ListRow({ lead, title, detail, end, href, onPress, selected, label }: ListRowProps) {
  const style = frame(selected, lead !== undefined, end !== undefined);
  const content = (
    <>
      {lead === undefined ? null : <span style={{ display: 'inline-flex' }}>{lead}</span>}
      <span style={{ minWidth: 0, overflowWrap: 'anywhere' }}>
        <span style={{ display: 'block', fontWeight: 600 }}>{title}</span>
        {detail ? <span style={{ display: 'block', color: color.inkSoft }}>{detail}</span> : null}
      </span>
      {end === undefined ? null : <span style={{ textAlign: 'right' }}>{end}</span>}
    </>
  );
  if (href) {
    return (
      <Link href={href} label={label} style={style} className="press" current={selected ? 'true' : undefined}>
        {content}
      </Link>
    );
  }
  if (onPress) {
    return (
      <button
        type="button"
        style={style}
        className="press"
        aria-label={label}
        aria-current={selected ? 'true' : undefined}
        onClick={onPress}
      >
        {content}
      </button>
    );
  }
  return <div style={style}>{content}</div>;
}

export interface ListProps<Row> {
  label: string;
  rows: readonly Row[];
  keyOf: (row: Row) => string;
  children: (row: Row) => ReactNode;
}

/** A real list: hairlines between the rows. */
export function List<Row>({ label, rows, keyOf, children }: ListProps<Row>) {
  return (
    <ul aria-label={label}>
      {rows.map((row, place) => (
        <li key={keyOf(row)} style={{ borderTop: place === 0 ? undefined : `1px solid ${color.lineHair}` }}>
          {children(row)}
        </li>
      ))}
    </ul>
  );
}
