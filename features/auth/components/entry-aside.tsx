import { BigPlate, ChainScale } from '@/components/residue';
import { useLayout } from '@/components/theme';
import { Stack, Text } from '@/components/ui';

/** What the product does, in one plate: beside the form of a wide screen, above it on a phone. */
export function EntryAside() {
  const { hasRail } = useLayout();
  return (
    <Stack gap={hasRail ? 20 : 12}>
      <Text kind="title" heading={2} style={hasRail ? { fontSize: 40, lineHeight: 48 } : undefined}>
        What your team knows, one residue at a time.
      </Text>
      <BigPlate
        family="c"
        part="rotor"
        code="E"
        number="47"
        level={2}
        verdict={
          <div>
            <div style={{ fontSize: 16, fontWeight: 600 }}>Glutamate</div>
            <div>one name, every numbering</div>
          </div>
        }
      />
      <ChainScale
        part="rotor"
        length={76}
        current={46}
        spans={[
          { from: 7, to: 33 },
          { from: 38, to: 68 },
        ]}
        pins={[20, 35, 52]}
        caption="Residue 47 of 76 on its chain; dots are pinned residues."
      />
      {hasRail ? (
        <Text tone="soft">
          The same place in every homolog, on each copy in each model, in each construct; with the reasons
          behind it and the primers made from it.
        </Text>
      ) : null}
    </Stack>
  );
}
