import ArrowRight from 'lucide-react-native/icons/arrow-right';
import { Plate, plateWords } from '@/components/residue';
import { face } from '@/components/theme';
import { counted, Icon, Row, Stack, Text } from '@/components/ui';
import { residuePath } from '@/client/paths';
import type { Design, Mutant } from '@/shared/contracts/plans';

interface MutantHeadingProps {
  projectId: string;
  mutant: Mutant;
  design: Design | undefined;
}

const chosenWords = {
  host: 'preferred by the host',
  fewest: 'fewest changed bases',
  both: 'preferred by the host and fewest changed bases',
} as const;

/** What becomes what: residues as plates, codons beneath. The page's first heading. */
export function MutantHeading({ projectId, mutant, design }: MutantHeadingProps) {
  return (
    <Stack gap={8}>
      <h1 style={{ display: 'grid', gap: 8 }}>
        <span className="sr-only">{`Mutant ${mutant.name}: `}</span>
        {mutant.mutations.map(({ residue, newResidues }) => {
          const words = plateWords(residue);
          return (
            <Row key={residue.residueIndex} gap={12}>
              <Plate {...words} size={44} href={residuePath(projectId, residue)} />
              <Icon of={ArrowRight} label="to" />
              <Plate {...words} code={newResidues} size={44} />
            </Row>
          );
        })}
      </h1>
      {(design?.codons ?? []).map((codon) => (
        <Row key={codon.codonStart} gap={8} wrap>
          <Text>{`codon ${codon.residue.label}`}</Text>
          <span style={{ fontFamily: face.mono, fontWeight: 700 }}>{codon.codonFrom}</span>
          <Icon of={ArrowRight} label="to" sizePixels={16} />
          <span style={{ fontFamily: face.mono, fontWeight: 700 }}>{codon.codonTo}</span>
          <Text tone="soft">
            {[
              `${counted(codon.changedBases, 'base')} changed`,
              codon.hostShare === null ? 'no host share' : `host share ${codon.hostShare.toFixed(2)}`,
              chosenWords[codon.chosenBy],
            ].join(', ')}
          </Text>
        </Row>
      ))}
    </Stack>
  );
}
