import type { Family } from '@/shared/contracts/families';
import { FamilyTag } from '@/components/residue';
import { color, face, radius } from '@/components/theme';
import { List, ListRow, Text } from '@/components/ui';
import { StandingMark, type ChainGroup } from '@/features/maps';
import { chainSentence } from '../chain-words';

export interface ChainsProps {
  groups: readonly ChainGroup[];
  families: ReadonlyMap<string, Family>;
  openKey: string | undefined;
  onOpen: (group: ChainGroup) => void;
}

/** The tag of a family, or an empty frame of its size where none is known or the chain is no protein. */
export function FamilyOf({ family, isProtein = true }: { family: Family | undefined; isProtein?: boolean }) {
  if (family) return <FamilyTag family={family.name} part={family.part} />;
  return (
    <span
      role="img"
      aria-label={isProtein ? 'no family yet' : 'not a protein'}
      style={{
        display: 'inline-grid',
        placeItems: 'center',
        width: 36,
        height: 32,
        border: `1.5px dashed ${color.lineControl}`,
        borderRadius: radius.plate,
        color: color.inkSoft,
        font: `700 16px/20px ${face.mono}`,
      }}
    >
      {isProtein ? '?' : '–'}
    </span>
  );
}

/** Chains of a structure as rows with a sentence, for a narrow screen. */
export function ChainList({ groups, families, openKey, onOpen }: ChainsProps) {
  return (
    <List label="Chains" rows={groups} keyOf={({ key }) => key}>
      {(group) => (
        <ListRow
          lead={
            <FamilyOf
              family={families.get(group.first.familyId ?? '')}
              isProtein={group.standing !== 'no protein'}
            />
          }
          title={
            <>
              <Text mono strong>
                {group.names}
              </Text>{' '}
              {group.chains.length > 1 ? <Text tone="soft">{`${group.chains.length} chains`}</Text> : null}
            </>
          }
          detail={
            <>
              {group.first.organism ? <i>{group.first.organism}. </i> : null}
              {chainSentence(group)}
            </>
          }
          end={<StandingMark group={group} />}
          selected={group.key === openKey}
          onPress={() => onOpen(group)}
        />
      )}
    </List>
  );
}
