import type { CSSProperties, ReactNode } from 'react';
import { color, face } from '@/components/theme';

export interface TableColumn<Row> {
  key: string;
  header: string;
  cell: (row: Row) => ReactNode;
  /** Numbers stand right, in the mono face. */
  numeric?: boolean;
  /** The cell that names the row, for screen readers. */
  rowHeader?: boolean;
  /** Sorted by this column, and how. */
  sorted?: 'ascending' | 'descending';
  onSort?: () => void;
}

export interface TableProps<Row> {
  /** What the table lists; spoken, and shown only to screen readers. */
  caption: string;
  columns: readonly TableColumn<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string;
  selectedKey?: string;
}

const cellStyle: CSSProperties = {
  padding: '7px 12px 7px 0',
  borderBottom: `1px solid ${color.lineHair}`,
  verticalAlign: 'middle',
  textAlign: 'left',
};
const number: CSSProperties = {
  textAlign: 'right',
  fontFamily: face.mono,
  letterSpacing: -0.3,
  whiteSpace: 'nowrap',
};

function HeaderCell<Row>({ column }: { column: TableColumn<Row> }) {
  return (
    <th
      scope="col"
      aria-sort={column.sorted}
      style={{
        ...cellStyle,
        ...(column.numeric ? { textAlign: 'right' } : null),
        font: `400 12px/16px ${face.text}`,
        color: color.inkSoft,
      }}
    >
      {column.onSort ? (
        <button
          type="button"
          style={{ minHeight: 'var(--row)', textDecoration: 'underline', textUnderlineOffset: 3 }}
          onClick={column.onSort}
        >
          {column.header}
        </button>
      ) : (
        column.header
      )}
    </th>
  );
}

/** A real table; on a narrow screen it scrolls sideways in its own frame, the page never does. */
export function Table<Row>({ caption, columns, rows, keyOf, selectedKey }: TableProps<Row>) {
  return (
    <div className="scroll-x" role="region" aria-label={caption} tabIndex={0}>
      <table
        style={{
          width: '100%',
          borderCollapse: 'collapse',
          font: `400 14px/20px ${face.text}`,
          color: color.ink,
        }}
      >
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <HeaderCell key={column.key} column={column} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => {
            const key = keyOf(row);
            const on = key === selectedKey;
            return (
              <tr
                key={key}
                aria-current={on ? 'true' : undefined}
                style={
                  on
                    ? { background: color.accentSoft, boxShadow: `inset 3px 0 0 ${color.accent}` }
                    : undefined
                }
              >
                {columns.map((column, place) => {
                  const style: CSSProperties = {
                    ...cellStyle,
                    height: 'var(--row)',
                    fontWeight: 400,
                    ...(column.numeric ? number : null),
                    ...(on && place === 0 ? { paddingLeft: 10 } : null),
                  };
                  const content = column.cell(row);
                  return column.rowHeader ? (
                    <th key={column.key} scope="row" style={style}>
                      {content}
                    </th>
                  ) : (
                    <td key={column.key} style={style}>
                      {content}
                    </td>
                  );
                })}
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}
