import { useState } from 'react';
import Check from 'lucide-react-native/icons/check';
import CircleDot from 'lucide-react-native/icons/circle-dot';
import Lock from 'lucide-react-native/icons/lock';
import type { Role } from '@/shared/permissions';
import { color, face } from '@/components/theme';
import { Caption, Mark, Segment, Stack, Text } from '@/components/ui';
import { rightsOf, rolesFromLead, type RightWords } from '../role-words';

interface RightsListProps {
  role: Role;
  readersMayComment: boolean;
  /** Who can give more. */
  leads: readonly string[];
}

function Answer({ answer }: Pick<RightWords, 'answer'>) {
  if (answer === 'may')
    return (
      <Mark tone="good" icon={Check}>
        may
      </Mark>
    );
  return answer === 'own' ? <Mark icon={CircleDot}>only own</Mark> : <Mark icon={Lock}>may not</Mark>;
}

/** What may I do here: the table the server asks, as a list for one role. */
export function RightsList({ role, readersMayComment, leads }: RightsListProps) {
  const [seenAs, setSeenAs] = useState<Role>(role);
  const options = rolesFromLead.map((value) => ({
    value,
    label: value === role ? `${value}, you` : value,
  }));
  return (
    <Stack gap={12}>
      <Caption>What may I do here</Caption>
      <div className="scroll-x bare">
        <Segment
          label="Seen as"
          options={options}
          value={seenAs}
          onChange={(value) => setSeenAs(rolesFromLead.find((one) => one === value) ?? role)}
        />
      </div>
      {rightsOf(seenAs, readersMayComment).map(({ title, rights }) => (
        <section key={title} aria-label={title}>
          <Caption level={3}>{title}</Caption>
          <ul>
            {rights.map(({ act, words, answer }, place) => (
              <li
                key={act}
                style={{
                  display: 'flex',
                  justifyContent: 'space-between',
                  alignItems: 'center',
                  gap: 12,
                  padding: '9px 0',
                  borderTop: place === 0 ? undefined : `1px solid ${color.lineHair}`,
                  color: answer === 'may not' ? color.inkSoft : color.ink,
                  font: `400 14px/20px ${face.text}`,
                }}
              >
                <span>{words}</span>
                <Answer answer={answer} />
              </li>
            ))}
          </ul>
        </section>
      ))}
      {role === 'lead' ? null : <Text tone="soft">{`To get more, ask a lead: ${leads.join(', ')}.`}</Text>}
    </Stack>
  );
}
