import { useState } from 'react';
import { Plate } from '@/components/residue';
import type { Part } from '@/components/theme';
import { TextInput } from '@/components/form';
import { Button, Caption, Mark, Row, Stack, Table, Text } from '@/components/ui';
import { residuePath } from '@/client/paths';
import type { Construct } from '@/shared/contracts/plans';
import type { Protein } from '@/shared/contracts/families';
import { baseRange, codonRows, type CodonRow } from '../codon-rows';

interface CodonTableProps {
  projectId: string;
  construct: Construct;
  protein: Protein;
  part: Part;
}

const rowsShown = 20;

/** Which codon encodes which residue, a stretch at a time. */
export function CodonTable({ projectId, construct, protein, part }: CodonTableProps) {
  const rows = codonRows(construct, protein);
  const [first, setFirst] = useState(0);
  const [wanted, setWanted] = useState('');
  const [unknown, setUnknown] = useState<string>();
  const size = construct.bases.length;
  const shown = rows.slice(first, first + rowsShown);
  const go = () => {
    const label = wanted.trim().replace(/^[A-Za-z]+(?=-?\d)/, '');
    const place = rows.findIndex((row) => row.label === label);
    setUnknown(
      place < 0
        ? `No codon encodes a residue ${label} in the ${protein.preferredNumbering} numbering.`
        : undefined,
    );
    if (place >= 0) setFirst(Math.max(0, place - 2));
  };
  return (
    <Stack gap={8}>
      <Caption count={`${rows.length} codons`}>Codons and residues</Caption>
      <form
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          go();
        }}
      >
        <Row gap={8} align="end" wrap>
          <div style={{ flex: '1 1 140px', maxWidth: 260 }}>
            <TextInput
              label={`Residue, ${protein.preferredNumbering} numbering`}
              value={wanted}
              onChange={setWanted}
              mono
              error={unknown}
            />
          </div>
          <Button submit>Go there</Button>
          <Button
            offReason={first === 0 ? 'At the first codon' : undefined}
            onPress={() => setFirst(Math.max(0, first - rowsShown))}
          >
            Before
          </Button>
          <Button
            offReason={first + rowsShown >= rows.length ? 'At the last codon' : undefined}
            onPress={() => setFirst(first + rowsShown)}
          >
            After
          </Button>
        </Row>
      </form>
      <Text kind="small" tone="soft" role="status">
        {`Codons ${first + 1} to ${first + shown.length} of ${rows.length}`}
      </Text>
      <Table
        caption="Codons and the residues they encode"
        rows={shown}
        keyOf={({ codon }) => String(codon)}
        columns={[
          {
            key: 'residue',
            header: 'residue',
            rowHeader: true,
            cell: (row) => <ResidueCell {...{ projectId, row, construct, protein, part }} />,
          },
          { key: 'codon', header: 'codon', numeric: true, cell: ({ bases }) => bases },
          { key: 'encodes', header: 'encodes', numeric: true, cell: ({ encoded }) => encoded },
          { key: 'bases', header: 'bases', numeric: true, cell: ({ base }) => baseRange(base, 3, size) },
          {
            key: 'differs',
            header: 'to look at',
            cell: ({ expected, encoded }) =>
              expected !== null && expected !== encoded ? (
                <Mark tone="warn">{`the protein has ${expected}`}</Mark>
              ) : null,
          },
        ]}
      />
    </Stack>
  );
}

function ResidueCell(props: CodonTableProps & { row: CodonRow }) {
  const { projectId, row, construct, protein, part } = props;
  const { residueIndex, label, expected, encoded } = row;
  if (residueIndex === null) return encoded === '*' ? 'stop' : 'added residue';
  return (
    <Plate
      family={construct.family}
      part={part}
      code={expected ?? encoded}
      number={label ?? ''}
      numbering={protein.preferredNumbering}
      organism={protein.organism}
      href={residuePath(projectId, { proteinId: protein.id, residueIndex })}
    />
  );
}
