import { useState } from 'react';
import UserMinus from 'lucide-react-native/icons/user-minus';
import type { Member } from '@/shared/contracts/projects';
import { Select } from '@/components/form';
import { useLayout } from '@/components/theme';
import { Banner, IconButton, List, ListRow, Person, Row, Stack } from '@/components/ui';
import { usePerson } from '@/client/session';
import { usePresence } from '@/client/use-live';
import { rolesFromLead } from '../role-words';
import { useChangeMember } from '../use-members';
import { LeaveDialog, type Leaving } from './leave-dialog';

interface MemberListProps {
  projectId: string;
  projectName: string;
  members: readonly Member[];
  /** A lead changes roles and removes people. */
  mayManage: boolean;
}

export function MemberList({ projectId, projectName, members, mayManage }: MemberListProps) {
  const own = usePerson()?.id;
  const { hasRail } = useLayout();
  const presence = usePresence(projectId);
  const change = useChangeMember(projectId);
  const [leaving, setLeaving] = useState<Leaving | null>(null);
  const leadCount = members.filter(({ role }) => role === 'lead').length;
  const isLast = ({ role }: Member) => role === 'lead' && leadCount === 1;
  const roleOptions = (member: Member) =>
    rolesFromLead.map((role) => ({
      value: role,
      label: role,
      off: isLast(member) && role !== 'lead',
    }));
  const setRole = (member: Member, value: string) => {
    const role = rolesFromLead.find((one) => one === value);
    if (!role || role === member.role) return;
    if (member.personId === own) setLeaving({ member, becomes: role });
    else change.mutate({ personId: member.personId, role });
  };
  const isHere = ({ personId }: Member) => presence.live && presence.people.some(({ id }) => id === personId);
  // A phone has no room for the address beside the role.
  const detail = (member: Member) =>
    [
      member.personId === own ? 'you' : '',
      hasRail || !mayManage ? member.email : '',
      isHere(member) ? 'here now' : '',
      isLast(member) && mayManage ? 'the only lead' : '',
    ]
      .filter(Boolean)
      .join(', ');
  return (
    <Stack gap={8}>
      {change.error ? <Banner kind="danger">{change.error.message}</Banner> : null}
      <List label="Members" rows={members} keyOf={({ personId }) => personId}>
        {(member) => (
          <ListRow
            lead={
              <Person
                name={member.name}
                presence={
                  presence.people.some(({ id }) => id === member.personId)
                    ? presence.live
                      ? 'here'
                      : 'was'
                    : undefined
                }
              />
            }
            title={member.name}
            detail={detail(member)}
            end={
              mayManage ? (
                <Row gap={4}>
                  <div style={{ width: 138 }}>
                    <Select
                      label={`Role of ${member.name}`}
                      quietLabel
                      options={roleOptions(member)}
                      value={member.role}
                      onChange={(value) => setRole(member, value)}
                    />
                  </div>
                  {isLast(member) ? (
                    <span style={{ width: 'var(--hit)' }} />
                  ) : (
                    <IconButton
                      icon={UserMinus}
                      label={`Remove ${member.name}`}
                      onPress={() => setLeaving({ member })}
                    />
                  )}
                </Row>
              ) : (
                member.role
              )
            }
          />
        )}
      </List>
      <LeaveDialog
        projectId={projectId}
        projectName={projectName}
        own={own}
        leaving={leaving}
        onClose={() => setLeaving(null)}
      />
    </Stack>
  );
}
