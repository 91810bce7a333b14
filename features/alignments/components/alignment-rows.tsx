import { useState, type CSSProperties } from 'react';
import { color, face, useLayout } from '@/components/theme';
import { Button, Link, Stack } from '@/components/ui';
import { proteinPath } from '@/client/paths';
import type { AlignmentWithRows } from '../apply-alignment-event';
import { rulerText } from '../ruler';

interface AlignmentRowsProps {
  projectId: string;
  alignment: Pick<AlignmentWithRows, 'rows' | 'columnCount'>;
}

/** So many rows are drawn at a time: beyond, the browser takes long to lay them out. */
const rowsAtOnce = 200;
const nameWidthPixels = { narrow: 104, wide: 220 };

const nameCell: CSSProperties = {
  position: 'sticky',
  left: 0,
  zIndex: 1,
  padding: '0 8px 0 0',
  background: color.paper,
  borderRight: `1px solid ${color.lineRule}`,
  textAlign: 'left',
  fontWeight: 400,
};
const letters: CSSProperties = {
  padding: '0 12px 0 8px',
  whiteSpace: 'pre',
  font: `400 14px/20px ${face.mono}`,
  letterSpacing: 2,
};
/** Ticks under the numbers: each column a small one, each fifth a middle one, each tenth a large one. */
const ticks = [
  { everyColumns: 10, heightPixels: 9 },
  { everyColumns: 5, heightPixels: 6 },
  { everyColumns: 1, heightPixels: 3 },
];
const column = '(1ch + 2px)';
const ruler: CSSProperties = {
  display: 'block',
  height: 9,
  backgroundRepeat: 'repeat-x',
  backgroundImage: ticks
    .map(() => `linear-gradient(90deg, transparent calc(100% - 1px), ${color.lineControl} 0)`)
    .join(', '),
  backgroundSize: ticks
    .map(({ everyColumns, heightPixels }) => `calc(${everyColumns} * ${column}) ${heightPixels}px`)
    .join(', '),
  // The tick of a column stands under the middle of its letter.
  backgroundPosition: ticks.map(() => 'left calc(-0.5ch - 1px) bottom').join(', '),
};

/** The rows as they stand in the file: names stay put, letters scroll sideways in their own frame. */
export function AlignmentRows({ projectId, alignment }: AlignmentRowsProps) {
  const { hasRail } = useLayout();
  const [shown, setShown] = useState(rowsAtOnce);
  const { rows, columnCount } = alignment;
  const left = rows.length - shown;
  const width = hasRail ? nameWidthPixels.wide : nameWidthPixels.narrow;
  const name: CSSProperties = { ...nameCell, width, minWidth: width, maxWidth: width };
  return (
    <Stack gap={12}>
      <div className="scroll-x" role="region" aria-label="Rows of the alignment" tabIndex={0}>
        <table style={{ borderCollapse: 'separate', borderSpacing: 0, color: color.ink }}>
          <caption className="sr-only">
            {`The rows, each a protein, with its letters in columns 1 to ${columnCount}; a hyphen is a gap.`}
          </caption>
          <thead>
            <tr>
              <th scope="col" style={{ ...name, font: `400 12px/16px ${face.text}`, color: color.inkSoft }}>
                column
              </th>
              <th scope="col" style={{ ...letters, color: color.inkSoft, textAlign: 'left' }}>
                <span className="sr-only">{`columns 1 to ${columnCount}`}</span>
                <span aria-hidden>{rulerText(columnCount)}</span>
                <span aria-hidden style={ruler} />
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.slice(0, shown).map((row) => (
              <tr key={row.rowIndex}>
                <th scope="row" style={name}>
                  <RowName
                    href={proteinPath(projectId, row.proteinId)}
                    name={row.name}
                    organism={row.organism}
                  />
                </th>
                <td style={letters}>{row.text}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {left > 0 ? (
        <div>
          <Button onPress={() => setShown(shown + rowsAtOnce)}>
            {`Show ${Math.min(left, rowsAtOnce)} more of ${rows.length} rows`}
          </Button>
        </div>
      ) : null}
    </Stack>
  );
}

const oneLine: CSSProperties = { overflow: 'hidden', textOverflow: 'ellipsis', whiteSpace: 'nowrap' };
const twoLines: CSSProperties = {
  display: '-webkit-box',
  WebkitBoxOrient: 'vertical',
  WebkitLineClamp: 2,
  overflow: 'hidden',
  overflowWrap: 'anywhere',
};

function RowName({ href, name, organism }: { href: string; name: string; organism: string }) {
  const isRenamed = organism !== name;
  return (
    <Link
      href={href}
      style={{
        display: 'flex',
        flexDirection: 'column',
        justifyContent: 'center',
        minHeight: 'var(--row)',
        font: `400 12px/16px ${face.text}`,
      }}
    >
      <span style={isRenamed ? oneLine : twoLines}>{isRenamed ? <i>{organism}</i> : name}</span>
      {isRenamed ? <span style={{ ...oneLine, color: color.inkSoft }}>{name}</span> : null}
    </Link>
  );
}
