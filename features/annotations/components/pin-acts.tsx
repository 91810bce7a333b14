import { useState } from 'react';
import Ellipsis from 'lucide-react-native/icons/ellipsis';
import {
  actOfAnnotationStatus,
  annotationSteps,
  type Annotation,
  type AnnotationStatus,
} from '@/shared/contracts/annotations';
import { Button, IconButton, Row, Stack } from '@/components/ui';
import { threadPath } from '@/client/paths';
import { usePerson } from '@/client/session';
import { useMay } from '@/features/projects';
import { useSetAnnotationStatus } from '../use-annotations';
import { EditPin } from './edit-pin';
import { ReasonDialog } from './reason-dialog';
import { Refusal } from './refusal';
import { Versions } from './versions';

const verbs: Record<AnnotationStatus, string> = {
  accepted: 'Accept',
  contested: 'Contest',
  retired: 'Retire',
  proposed: 'Propose again',
};
const asksReason = (to: AnnotationStatus): boolean => to === 'contested' || to === 'retired';

interface PinActsProps {
  projectId: string;
  annotation: Annotation;
  /** Short words by which the buttons tell this pin from others. */
  name: string;
}

/** What may be done with a pin by one's rights: its next steps, its text, its history, its thread. */
export function PinActs({ projectId, annotation, name }: PinActsProps) {
  const may = useMay(projectId);
  const own = annotation.by.id === usePerson()?.id;
  const [shown, setShown] = useState(false);
  const [asked, setAsked] = useState<AnnotationStatus | null>(null);
  const [open, setOpen] = useState<'edit' | 'versions' | null>(null);
  const set = useSetAnnotationStatus(projectId);
  const steps = annotationSteps[annotation.status].filter((to) => may(actOfAnnotationStatus[to], { own }));
  const take = (to: AnnotationStatus) =>
    asksReason(to)
      ? setAsked(to)
      : set.mutate({
          annotationId: annotation.id,
          version: annotation.version,
          body: { status: to, reason: '' },
        });
  const stepButton = (to: AnnotationStatus) => (
    <Button
      key={to}
      kind={to === 'accepted' ? 'plain' : 'quiet'}
      label={`${verbs[to]}: ${name}`}
      onPress={() => take(to)}
      busyText={set.isPending && set.variables.body.status === to ? 'Saving' : undefined}
    >
      {verbs[to]}
    </Button>
  );
  return (
    <Stack gap={4} style={{ marginTop: 4 }}>
      <Row gap={4} wrap>
        {steps.includes('accepted') ? stepButton('accepted') : null}
        <IconButton
          icon={Ellipsis}
          label={`What can be done with: ${name}`}
          expanded={shown}
          onPress={() => setShown(!shown)}
        />
        {shown ? (
          <>
            {steps.filter((to) => to !== 'accepted').map(stepButton)}
            {may('edit annotation', { own }) && annotation.status !== 'retired' ? (
              <Button kind="quiet" label={`Edit: ${name}`} onPress={() => setOpen('edit')}>
                Edit
              </Button>
            ) : null}
            <Button kind="quiet" label={`Versions: ${name}`} onPress={() => setOpen('versions')}>
              {`Versions ${annotation.versionNumber}`}
            </Button>
            <Button
              kind="quiet"
              label={`Thread: ${name}`}
              href={threadPath(projectId, { kind: 'annotation', id: annotation.id })}
            >
              Thread
            </Button>
          </>
        ) : null}
      </Row>
      <Refusal problem={set.error} />
      <ReasonDialog projectId={projectId} annotation={annotation} to={asked} onClose={() => setAsked(null)} />
      <EditPin
        projectId={projectId}
        annotation={annotation}
        open={open === 'edit'}
        onClose={() => setOpen(null)}
      />
      <Versions
        projectId={projectId}
        annotation={annotation}
        open={open === 'versions'}
        onClose={() => setOpen(null)}
      />
    </Stack>
  );
}
