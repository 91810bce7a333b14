import { useState } from 'react';
import Pencil from 'lucide-react-native/icons/pencil';
import { proteinParams, type Numbering, type Protein } from '@/shared/contracts/families';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { FamilyTag, SequenceGrid } from '@/components/residue';
import { Button, Caption, Link, NothingHere, ReadView, Stack, Text } from '@/components/ui';
import { familyPath, findPath, residuePath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useMay } from '@/features/projects';
import { GoToResidue } from '../components/go-to-residue';
import { NumberingTable } from '../components/numbering-table';
import { OffsetForm } from '../components/offset-form';
import { RenameProtein } from '../components/rename-protein';
import { labelledLetters, preferredOf } from '../offset-preview';
import { useFamilies, useProtein } from '../use-families';

/** One protein: its sequence with a link to each residue, and what its residues are called. */
export function ProteinScreen() {
  const given = useRouteParams(proteinParams);
  const protein = useProtein(given?.projectId ?? '', given?.proteinId ?? null);
  if (!given) return <NothingHere />;
  const { projectId } = given;
  if (protein.data) return <OneProtein key={protein.data.id} projectId={projectId} protein={protein.data} />;
  return (
    <Screen title="Protein" backHref={findPath(projectId)}>
      <ReadView of={protein} what="the protein">
        {() => null}
      </ReadView>
    </Screen>
  );
}

function OneProtein({ projectId, protein }: { projectId: string; protein: Protein }) {
  const { data: families } = useFamilies(projectId);
  const may = useMay(projectId);
  const [renamed, setRenamed] = useState<Protein | null>(null);
  const family = families?.find(({ id }) => id === protein.familyId);
  const name = family?.name ?? '';
  const mayNumber = may('set numbering');
  const sequence = (
    <Stack gap={16}>
      <div style={{ display: 'flex', gap: 12, alignItems: 'flex-start' }}>
        {family ? (
          <FamilyTag
            family={name}
            part={family.part}
            size={44}
            href={familyPath(projectId, protein.familyId)}
          />
        ) : null}
        <div style={{ flex: 1, minWidth: 0 }}>
          <PageTitle
            detail={`family ${name}, ${protein.length} residues`}
            action={
              may('edit family') ? (
                <Button kind="quiet" icon={Pencil} onPress={() => setRenamed(protein)}>
                  Rename
                </Button>
              ) : undefined
            }
          >
            <i>{protein.organism}</i>
          </PageTitle>
        </div>
      </div>
      <GoToResidue projectId={projectId} protein={protein} isMain={!mayNumber} />
      <Caption count={`${protein.preferredNumbering} numbering`}>Sequence</Caption>
      <SequenceGrid
        label={`${name} of ${protein.organism}, ${protein.preferredNumbering} numbering, arrows walk`}
        letters={labelledLetters(protein, preferredOf(protein)).map(({ code, number, index }) => ({
          code,
          number,
          href: residuePath(projectId, { proteinId: protein.id, residueIndex: index }),
        }))}
      />
    </Stack>
  );
  const items = [
    { key: 'protein', label: 'Protein', value: `${name}, ${protein.organism}` },
    { key: 'residues', label: 'Residues', value: protein.length },
    { key: 'numbering', label: 'Numbering', value: protein.preferredNumbering },
  ];
  return (
    <Screen
      kind="panes"
      title={`${name} ${protein.organism}`}
      backHref={familyPath(projectId, protein.familyId)}
      items={items}
    >
      <Panes
        name="protein"
        panes={[
          { key: 'sequence', label: 'Sequence', content: sequence },
          {
            key: 'numberings',
            label: 'Numberings',
            widthPixels: 480,
            content: <Numberings projectId={projectId} protein={protein} mayNumber={mayNumber} />,
          },
        ]}
      />
      {renamed ? (
        <RenameProtein projectId={projectId} protein={renamed} onClose={() => setRenamed(null)} />
      ) : null}
    </Screen>
  );
}

interface NumberingsProps {
  projectId: string;
  protein: Protein;
  mayNumber: boolean;
}

const madeByOffset = ({ kind }: Numbering) => kind === 'offset';

/** What the residues are called, and for a curator the way to add one numbering. */
function Numberings({ projectId, protein, mayNumber }: NumberingsProps) {
  // The one there is is changed rather than doubled, until a new one is asked for.
  const [changedId, setChangedId] = useState(() => protein.numberings.find(madeByOffset)?.id);
  const changed = protein.numberings.find(({ id }) => id === changedId);
  return (
    <Stack gap={16}>
      <Caption count={protein.numberings.length}>Numberings</Caption>
      <NumberingTable protein={protein} onChange={mayNumber ? ({ id }) => setChangedId(id) : undefined} />
      {mayNumber ? (
        <>
          <Caption
            action={
              changed ? (
                <Button kind="quiet" onPress={() => setChangedId(undefined)}>
                  Make a new one instead
                </Button>
              ) : undefined
            }
          >
            {changed ? `Change ${changed.name}` : 'Number by an offset'}
          </Caption>
          <OffsetForm
            key={changed?.id ?? 'new'}
            projectId={projectId}
            protein={protein}
            numbering={changed}
          />
        </>
      ) : (
        <Text tone="soft">Numberings are set by curators and leads.</Text>
      )}
      <p>
        <Link href={familyPath(projectId, protein.familyId)}>The family and its other proteins</Link>
      </p>
    </Stack>
  );
}
