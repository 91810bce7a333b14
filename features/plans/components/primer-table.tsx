import type { ReactNode } from 'react';
import { face, usePrinting } from '@/components/theme';
import { Caption, CopyButton, Stack, Table, Text } from '@/components/ui';
import type { Design, Primer } from '@/shared/contracts/plans';
import { figure } from '../check-words';
import { concentrationWords, methodWords } from '../condition-words';
import { inTriplets } from '../primer-picture';

interface FigureRow {
  key: string;
  name: string;
  of: (primer: Primer) => ReactNode;
}

const figureRows: readonly FigureRow[] = [
  {
    key: 'bases',
    name: 'bases, 5′ to 3′',
    of: ({ bases }) => inTriplets(bases),
  },
  { key: 'length', name: 'length, nt', of: ({ length }) => length },
  { key: 'gc', name: 'G and C, %', of: ({ gcPercent }) => figure(gcPercent) },
  { key: 'melting', name: 'melting, °C', of: ({ meltingCelsius }) => figure(meltingCelsius) },
  {
    key: 'annealing',
    name: 'annealing to the template, °C',
    of: ({ annealingCelsius }) => figure(annealingCelsius),
  },
  { key: 'hairpin', name: 'hairpin, kcal/mol', of: ({ hairpinKcalPerMol }) => figure(hairpinKcalPerMol) },
  {
    key: 'dimer',
    name: 'self dimer, kcal/mol',
    of: ({ selfDimerKcalPerMol }) => figure(selfDimerKcalPerMol),
  },
  { key: 'places', name: 'second places', of: ({ misprimingSites }) => misprimingSites },
  {
    key: 'copy',
    name: 'bases to the clipboard',
    of: ({ name, bases }) => <CopyButton text={bases} label={`Copy the bases of ${name}`} />,
  },
];

/** The primers with everything that was calculated of them. */
export function PrimerTable({ design }: { design: Design }) {
  const isPrinting = usePrinting();
  const rows = isPrinting ? figureRows.filter(({ key }) => key !== 'copy') : figureRows;
  return (
    <Stack gap={8}>
      <Caption count="complementary pair">Primers</Caption>
      <Table
        caption="The primers of this design"
        rows={rows}
        keyOf={({ key }) => key}
        columns={[
          { key: 'figure', header: 'figure', rowHeader: true, cell: ({ name }) => name },
          ...design.primers.map((primer) => ({
            key: primer.name,
            header: `${primer.name}, ${primer.strand === '+' ? 'forward' : 'reverse'}`,
            cell: ({ of }: FigureRow) => <span style={{ fontFamily: face.mono }}>{of(primer)}</span>,
          })),
        ]}
      />
      <Text kind="meta" tone="soft">
        {`Temperatures for ${concentrationWords()}: ${methodWords()}. Hairpin and dimer at 37 °C in 1 M salt.`}
      </Text>
    </Stack>
  );
}
