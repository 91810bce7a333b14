import { Button, Dialog, Key, Row, Text } from '@/components/ui';
import { color } from '@/components/theme';

const keys: { keys: string[]; does: string }[] = [
  { keys: ['/'], does: 'Find a residue' },
  { keys: ['[', ']'], does: 'Residue before and after, on a residue' },
  { keys: ['p'], does: 'Pin here, on a residue' },
  { keys: ['r'], does: 'Reply, on a residue' },
  { keys: ['Enter'], does: 'Open what is highlighted' },
  { keys: ['F6'], does: 'Next pane' },
  { keys: ['Esc'], does: 'Close what is open' },
  { keys: ['?'], does: 'These keys' },
];

export function KeysDialog({ open, onClose }: { open: boolean; onClose: () => void }) {
  return (
    <Dialog open={open} title="Keys" onClose={onClose} actions={<Button onPress={onClose}>Close</Button>}>
      <ul aria-label="Keys">
        {keys.map((row) => (
          <li key={row.does} style={{ padding: '8px 0', borderTop: `1px solid ${color.lineHair}` }}>
            <Row justify="between" gap={16}>
              <Text kind="small">{row.does}</Text>
              <Row gap={4}>
                {row.keys.map((key) => (
                  <Key key={key}>{key}</Key>
                ))}
              </Row>
            </Row>
          </li>
        ))}
      </ul>
    </Dialog>
  );
}
