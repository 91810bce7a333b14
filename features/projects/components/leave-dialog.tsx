import type { Member } from '@/shared/contracts/projects';
import type { Role } from '@/shared/permissions';
import { Banner, Button, Dialog, Text } from '@/components/ui';
import { useChangeMember, useRemoveMember } from '../use-members';

/** Somebody goes, or oneself takes another role: both are asked once. */
export interface Leaving {
  member: Member;
  becomes?: Role;
}

interface LeaveDialogProps {
  projectId: string;
  projectName: string;
  own: string | undefined;
  leaving: Leaving | null;
  onClose: () => void;
}

export function LeaveDialog({ projectId, projectName, own, leaving, onClose }: LeaveDialogProps) {
  const remove = useRemoveMember(projectId);
  const change = useChangeMember(projectId);
  if (!leaving) return null;
  const { member, becomes } = leaving;
  const { personId, name } = member;
  const isOwn = personId === own;
  const close = () => {
    remove.reset();
    change.reset();
    onClose();
  };
  const go = () =>
    becomes
      ? change.mutate({ personId, role: becomes }, { onSuccess: close })
      : remove.mutate({ personId }, { onSuccess: close });
  const [title, words, verb] = becomes
    ? [
        `Become ${becomes} yourself?`,
        'You then no longer manage members and settings. Another lead can make you a lead again.',
        `Become ${becomes}`,
      ]
    : isOwn
      ? [
          `Leave ${projectName}?`,
          'You no longer see this project. What you wrote stays, under your name. A lead can add you again.',
          'Leave',
        ]
      : [
          `Remove ${name}?`,
          `${name} no longer sees ${projectName}. What they wrote stays, under their name. They can be added again.`,
          'Remove',
        ];
  const error = remove.error ?? change.error;
  const isBusy = remove.isPending || change.isPending;
  return (
    <Dialog
      open
      title={title}
      onClose={close}
      actions={
        <>
          <Button onPress={close}>Keep as it is</Button>
          <Button kind="danger" onPress={go} busyText={isBusy ? 'Doing it' : undefined}>
            {verb}
          </Button>
        </>
      }
    >
      <Text>{words}</Text>
      {error ? <Banner kind="danger">{error.message}</Banner> : null}
    </Dialog>
  );
}
