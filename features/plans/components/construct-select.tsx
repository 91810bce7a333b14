import { Select } from '@/components/form';
import { Link } from '@/components/ui';
import { newConstructPath } from '@/client/paths';
import type { Construct } from '@/shared/contracts/plans';

interface ConstructSelectProps {
  projectId: string;
  proteinId: string;
  /** Constructs of the project. */
  constructs: readonly Construct[] | undefined;
  value: string;
  onChange: (constructId: string) => void;
  error?: string;
  /** A mutant may be planned before its DNA is there. */
  noneAllowed?: boolean;
}

/** A construct that encodes the protein. */
export function ConstructSelect(props: ConstructSelectProps) {
  const { projectId, proteinId, constructs, value, onChange, error, noneAllowed } = props;
  const fitting = (constructs ?? []).filter((construct) => construct.proteinId === proteinId);
  return (
    <Select
      label="Construct"
      hint={
        proteinId && constructs && fitting.length === 0 ? (
          <>
            No construct encodes this protein yet.{' '}
            <Link href={newConstructPath(projectId, proteinId || undefined)}>Add one</Link>
          </>
        ) : undefined
      }
      placeholder={noneAllowed ? 'None yet: plan the change alone' : 'Choose a construct'}
      options={fitting.map(({ id, name, bases }) => ({ value: id, label: `${name}, ${bases.length} bases` }))}
      value={value}
      onChange={onChange}
      error={error}
    />
  );
}
