import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { color, face } from '@/components/theme';
import { Button } from './button';
import { Icon } from './icon';

export interface BothTextsProps {
  /** What was changed meanwhile, by whom if it is known: "Somebody changed these settings meanwhile." */
  sentence: string;
  rows: readonly { key: string; name: string; theirs: string; mine: string }[];
  onTakeTheirs: () => void;
  onKeepMine: () => void;
  busyText?: string;
}

const cell = { minWidth: 0, overflowWrap: 'anywhere' } as const;

/** What stands there now beside what one wrote oneself. Nothing is overwritten before one of them is chosen. */
export function BothTexts({ sentence, rows, onTakeTheirs, onKeepMine, busyText }: BothTextsProps) {
  return (
    <section
      aria-label="Two versions"
      style={{
        display: 'grid',
        gap: 12,
        padding: '14px 16px',
        border: `1.5px solid ${color.warn}`,
        borderRadius: 4,
        background: color.raised,
        color: color.ink,
        font: `400 14px/20px ${face.text}`,
      }}
    >
      <p role="alert" style={{ display: 'flex', gap: 10 }}>
        <Icon of={TriangleAlert} tone="warn" label="warning" />
        <span>{sentence} Nothing of yours is lost.</span>
      </p>
      {rows.map(({ key, name, theirs, mine }) => (
        <div key={key}>
          <h3 style={{ font: `600 14px/20px ${face.text}` }}>{name}</h3>
          <dl style={{ display: 'grid', gridTemplateColumns: '72px minmax(0,1fr)', gap: '4px 12px' }}>
            <dt style={{ color: color.inkSoft }}>there now</dt>
            <dd style={cell}>{theirs}</dd>
            <dt style={{ color: color.inkSoft }}>yours</dt>
            <dd style={{ ...cell, fontWeight: theirs === mine ? 400 : 600 }}>{mine}</dd>
          </dl>
        </div>
      ))}
      <div style={{ display: 'flex', flexWrap: 'wrap', gap: 8 }}>
        <Button onPress={onTakeTheirs}>Take what is there</Button>
        <Button kind="primary" onPress={onKeepMine} busyText={busyText}>
          Save mine
        </Button>
      </div>
    </section>
  );
}
