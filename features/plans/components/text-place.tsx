import { color, face } from '@/components/theme';
import { Caption, Stack } from '@/components/ui';

export interface TextPlaceProps {
  text: string;
  /** From 1. */
  line: number;
  column?: number;
}

const contextLines = 1;
const columnsAround = 40;

/** The pasted text at the place of an issue, the character marked. */
export function TextPlace({ text, line, column }: TextPlaceProps) {
  const lines = text.split(/\r\n|\r|\n/);
  const first = Math.max(1, line - contextLines);
  const last = Math.min(lines.length, line + contextLines);
  const from = Math.max(0, (column ?? 1) - columnsAround);
  const numbers = Array.from({ length: last - first + 1 }, (_, step) => first + step);
  const title = column === undefined ? `Line ${line}` : `Line ${line}, column ${column}`;
  return (
    <Stack gap={4}>
      <Caption level={3} count="of the pasted text">
        {title}
      </Caption>
      <div
        className="scroll-x"
        role="group"
        aria-label={`The text at ${title.toLowerCase()}`}
        tabIndex={0}
        style={{ background: color.sunken, borderRadius: 4, padding: '10px 12px' }}
      >
        {numbers.map((number) => (
          <pre key={number} style={{ font: `400 14px/22px ${face.mono}`, color: color.ink }}>
            <span style={{ color: color.inkSoft }}>{`${number}  `}</span>
            <Marked
              text={(lines[number - 1] ?? '').slice(from, from + 2 * columnsAround)}
              at={number === line && column !== undefined ? column - 1 - from : -1}
            />
          </pre>
        ))}
      </div>
    </Stack>
  );
}

function Marked({ text, at }: { text: string; at: number }) {
  if (at < 0 || at >= text.length) return text;
  return (
    <>
      {text.slice(0, at)}
      <mark style={{ background: color.danger, color: color.dangerOn }}>{text[at]}</mark>
      {text.slice(at + 1)}
    </>
  );
}
