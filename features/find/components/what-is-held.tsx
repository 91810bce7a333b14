import type { OwnProject } from '@/shared/contracts/projects';
import { PageTitle } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Button, Caption, Empty, Row, Stack } from '@/components/ui';
import { newUploadPath } from '@/client/paths';
import type { Holdings } from '../use-holdings';
import { AlignmentList } from './alignment-list';
import { FamiliesCaption } from './families-caption';
import { FamilyList } from './family-list';
import { StructureList } from './structure-list';
import { UploadList } from './upload-list';

interface WhatIsHeldProps {
  project: OwnProject;
  holdings: Holdings;
  mayUpload: boolean;
}

/** Families at one side; alignments, structures and files on their way at the other. */
export function WhatIsHeld({ project, holdings, mayUpload }: WhatIsHeldProps) {
  const { hasRail } = useLayout();
  const { id: projectId } = project;
  const { families, alignments, structures, uploads } = holdings;
  const nobodyYet = mayUpload ? undefined : ' Curators and leads upload.';
  return (
    <>
      <PageTitle
        quietOnPhone
        action={
          hasRail && mayUpload ? <UploadButtons projectId={projectId} holdings={holdings} /> : undefined
        }
      >
        What {project.name} holds
      </PageTitle>
      <div
        style={{
          display: 'grid',
          gridTemplateColumns: hasRail ? 'minmax(0,5fr) minmax(0,6fr)' : 'minmax(0,1fr)',
          gap: '24px 44px',
          alignItems: 'start',
        }}
      >
        <Stack gap={8}>
          <FamiliesCaption projectId={projectId} count={`${families.length}`} />
          <FamilyList projectId={projectId} families={families} />
        </Stack>
        <Stack gap={24}>
          {uploads.length > 0 ? (
            <Stack gap={8}>
              <Caption count={uploads.length}>On the way or refused</Caption>
              <UploadList projectId={projectId} uploads={uploads} />
            </Stack>
          ) : null}
          <Stack gap={8}>
            <Caption count={alignments.length}>Alignments</Caption>
            {alignments.length > 0 ? (
              <AlignmentList projectId={projectId} alignments={alignments} families={families} />
            ) : (
              <Empty title="No alignment yet">
                An aligned FASTA file of one family fills this: each row becomes a protein.{nobodyYet}
              </Empty>
            )}
          </Stack>
          <Stack gap={8}>
            <Caption count={structures.length}>Structures</Caption>
            {structures.length > 0 ? (
              <StructureList projectId={projectId} structures={structures} />
            ) : (
              <Empty title="No structure yet">
                A PDB-format file fills this: each chain is matched to a protein.{nobodyYet}
              </Empty>
            )}
          </Stack>
        </Stack>
      </div>
    </>
  );
}

interface UploadButtonsProps {
  projectId: string;
  holdings: Pick<Holdings, 'alignments' | 'structures'>;
}

/** The two files a project is made of; the one that is still missing comes to the fore. */
export function UploadButtons({ projectId, holdings }: UploadButtonsProps) {
  const { hasRail } = useLayout();
  const needsStructure = holdings.alignments.length > 0 && holdings.structures.length === 0;
  return (
    <Row gap={8} style={{ flexGrow: 1 }}>
      <Button
        kind={needsStructure ? 'primary' : 'plain'}
        href={newUploadPath(projectId, 'structure')}
        full={!hasRail}
      >
        Upload coordinates
      </Button>
      <Button
        kind={needsStructure ? 'plain' : 'primary'}
        href={newUploadPath(projectId, 'alignment')}
        full={!hasRail}
      >
        Upload an alignment
      </Button>
    </Row>
  );
}
