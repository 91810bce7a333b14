import type { Passport } from '@/shared/contracts/residues';
import { usePrinting } from '@/components/theme';
import { Stack } from '@/components/ui';
import { PinsSection } from '@/features/annotations';
import { CarriedSection } from './carried-section';
import { ColumnTable } from './column-table';
import { CopiesSection } from './copies-section';
import { MutantsSection } from './mutants-section';
import { PassportSection } from './passport-section';
import { ResidueHead } from './residue-head';
import { TypedChange } from './typed-change';

interface ResiduePageProps {
  projectId: string;
  passport: Passport;
  becomes?: string;
  onPin: () => void;
  /** The column and the copies stand in a pane of their own. */
  hasSource: boolean;
}

/** One residue: what it is, what it is called, what is known of it and planned with it. */
export function ResiduePage({ projectId, passport, becomes, onPin, hasSource }: ResiduePageProps) {
  const { residue } = passport;
  const isPrinting = usePrinting();
  const isWhole = isPrinting || !hasSource;
  return (
    <Stack gap={24}>
      <ResidueHead projectId={projectId} passport={passport} />
      {becomes ? <TypedChange projectId={projectId} residue={residue} becomes={becomes} /> : null}
      <PassportSection passport={passport} />
      <CarriedSection passport={passport} />
      <PinsSection projectId={projectId} residue={residue} onPin={onPin} />
      <MutantsSection projectId={projectId} residue={residue} />
      {isWhole ? <CopiesSection projectId={projectId} passport={passport} /> : null}
      {isWhole ? <ColumnTable projectId={projectId} passport={passport} /> : null}
    </Stack>
  );
}
