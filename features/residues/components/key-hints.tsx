import { Key, Row, Text } from '@/components/ui';
import { useLayout } from '@/components/theme';

/** What the keys do in the list of readings. */
export function KeyHints() {
  const { hasRail } = useLayout();
  if (!hasRail) return null;
  return (
    <Row gap={14} wrap style={{ paddingTop: 16, paddingHorizontal: 12 }}>
      {[
        ['Down', 'choose'],
        ['Enter', 'go'],
        ['Esc', 'close'],
      ].map(([key = '', word]) => (
        <Row key={key} gap={6}>
          <Key>{key}</Key>
          <Text kind="small" tone="soft">
            {word}
          </Text>
        </Row>
      ))}
    </Row>
  );
}
