import { BigPlate, ChainScale } from '@/components/residue';
import { Stack, Text } from '@/components/ui';

/** What the product does, in one plate: beside the sign-in form of a wide screen. */
export function EntryAside() {
  return (
    <Stack gap={16}>
      <Text kind="title" heading={2}>
        What your team knows, one residue at a time.
      </Text>
      <BigPlate
        family="c"
        part="rotor"
        code="E"
        number="47"
        numbering="mature"
        level={2}
        verdict="one name, every numbering"
      />
      <ChainScale
        part="rotor"
        length={76}
        current={46}
        pins={[20, 46, 52]}
        caption="residue 47 of 76; dots are pinned residues"
      />
      <Text tone="soft">
        The same place in every homolog, on each copy in each model, in each construct; with the reasons
        behind it and the primers made from it.
      </Text>
    </Stack>
  );
}
