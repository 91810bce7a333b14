import { useState } from 'react';
import type { Part } from '@/components/theme';
import { Button, Caption, Stack, Table, Text } from '@/components/ui';
import { baseRange, type CodingConstruct, type LabelledProtein } from '../codon-rows';
import { primerPicture, type PictureCodon, type PicturePrimer, type PrimerPicture } from '../primer-picture';
import { PrimerDrawing } from './primer-drawing';
import type { Design } from '@/shared/contracts/plans';

interface PrimersOnTemplateProps {
  construct: CodingConstruct;
  protein: LabelledProtein | undefined;
  design: Design;
  part: Part;
}

/** Where the primers lie, as a drawing or as a table. */
export function PrimersOnTemplate({ construct, protein, design, part }: PrimersOnTemplateProps) {
  const [asTable, setAsTable] = useState(false);
  const picture = primerPicture(construct, protein, design);
  if (!picture) return <Text tone="soft">The construct has changed since: design the primers again.</Text>;
  const size = construct.bases.length;
  return (
    <Stack gap={8}>
      <Caption
        action={
          <Button kind="quiet" onPress={() => setAsTable(!asTable)}>
            {asTable ? 'As a drawing' : 'As a table'}
          </Button>
        }
      >
        Primers on the template
      </Caption>
      {asTable ? (
        <CodonTable picture={picture} size={size} />
      ) : (
        <PrimerDrawing picture={picture} part={part} label={sentenceOf(picture, size)} />
      )}
    </Stack>
  );
}

function CodonTable({ picture, size }: { picture: PrimerPicture; size: number }) {
  const lettersAt = ({ column, letters }: PicturePrimer, codon: PictureCodon) =>
    [0, 1, 2].map((step) => letters[codon.column + step - column] ?? '·').join('');
  const misses = (primer: PicturePrimer, codon: PictureCodon) =>
    [0, 1, 2].filter((step) => primer.pairs[codon.column + step - primer.column] === false).length;
  return (
    <Table
      caption="Primers on the template, codon by codon; primers as they lie, the reverse one from its 3′ end"
      rows={picture.codons}
      keyOf={({ column }) => String(column)}
      columns={[
        { key: 'bases', header: 'bases', numeric: true, cell: ({ base }) => baseRange(base, 3, size) },
        {
          key: 'residue',
          header: 'residue',
          rowHeader: true,
          cell: ({ encoded, label }) => (label === null ? `${encoded}, no label` : `${encoded}${label}`),
        },
        { key: 'template', header: 'template', numeric: true, cell: ({ bases }) => bases },
        ...picture.primers.map((primer) => ({
          key: primer.name,
          header: primer.name,
          numeric: true,
          cell: (codon: PictureCodon) => lettersAt(primer, codon),
        })),
        {
          key: 'mismatches',
          header: 'mismatches',
          numeric: true,
          cell: (codon) => Math.max(...picture.primers.map((primer) => misses(primer, codon))),
        },
      ]}
    />
  );
}

function sentenceOf(picture: PrimerPicture, size: number): string {
  const changes = picture.codons
    .filter(({ codonTo }) => codonTo !== null)
    .map(({ bases, codonTo, label, base }) => `${bases} becomes ${codonTo} at codon ${label ?? base + 1}`);
  const primers = picture.primers.map(({ name, strand, letters, pairs }) => {
    const misses = pairs.filter((pair) => !pair).length;
    const direction =
      strand === '+'
        ? 'pairs with the bottom strand and runs right'
        : 'pairs with the top strand and runs left';
    return `${name}, ${letters.length} bases, ${direction}, ${misses} mismatches`;
  });
  const span = baseRange(picture.firstBase, picture.top.length, size);
  return `Both strands of bases ${span}, drawn apart. ${changes.join('; ')}. ${primers.join('. ')}.`;
}
