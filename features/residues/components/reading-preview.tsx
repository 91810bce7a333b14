import type { Reading } from '@/shared/contracts/residues';
import { BigPlate, shortLabel } from '@/components/residue';
import { Button, Caption, Loading, Stack, Text } from '@/components/ui';
import { residuePath } from '@/client/paths';
import { usePassport } from '../use-residues';
import { PassportList } from './passport-list';

/** The passport of the highlighted reading, so that one sees what would be opened. */
export function ReadingPreview({ projectId, reading }: { projectId: string; reading: Reading | null }) {
  if (!reading)
    return (
      <Text kind="small" tone="soft">
        The passport of the highlighted reading stands here.
      </Text>
    );
  const { residue, mutationTo, pinCount } = reading;
  const words = { family: residue.family, code: residue.letter, number: residue.label };
  return (
    <Stack>
      <BigPlate
        {...words}
        level={2}
        part={residue.part}
        numbering={residue.numbering}
        organism={residue.organism}
      />
      <Passport projectId={projectId} reading={reading} />
      <Caption level={3} count={pinCount}>
        Pins
      </Caption>
      <Button kind="primary" full href={residuePath(projectId, residue, mutationTo)}>
        {`Go to ${residue.family} ${shortLabel(words)}`}
      </Button>
    </Stack>
  );
}

function Passport({ projectId, reading: { residue } }: { projectId: string; reading: Reading }) {
  const { data, error } = usePassport(projectId, residue.proteinId, residue.residueIndex);
  if (data) return <PassportList passport={data} />;
  return error ? <Text kind="small">{error.message}</Text> : <Loading>Reading the passport</Loading>;
}
