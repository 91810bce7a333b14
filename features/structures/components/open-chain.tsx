import { useEffect, useRef } from 'react';
import type { Family } from '@/shared/contracts/families';
import { useLayout } from '@/components/theme';
import { Caption, Row, Stack, Text } from '@/components/ui';
import {
  ChainDecision,
  MapExceptions,
  StandingMark,
  type ChainGroup,
  type DecideChains,
} from '@/features/maps';
import { groupTitle } from '../chain-words';
import { ChainFacts } from './chain-facts';
import { FamilyOf } from './chain-list';

interface OpenChainProps {
  projectId: string;
  group: ChainGroup;
  families: readonly Family[];
  /** Null for whoever may only look. */
  deciding: DecideChains | null;
  isPrimary: boolean;
  /** It was asked for by hand: on a phone the page moves to it. */
  isAsked: boolean;
}

/** The chains that are looked at: how they were matched, every exception, and what a curator can say. */
export function OpenChain({ projectId, group, families, deciding, isPrimary, isAsked }: OpenChainProps) {
  const { hasRail } = useLayout();
  const top = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (isAsked && !hasRail) top.current?.scrollIntoView({ block: 'start' });
  }, [isAsked, hasRail, group.key]);
  const { first, chains, standing } = group;
  const family = families.find(({ id }) => id === first.familyId);
  const isProtein = standing !== 'no protein';
  return (
    <div ref={top}>
      <Stack gap={16}>
        <Row justify="between" wrap>
          <Text kind="head" heading={2}>
            {groupTitle(group)}
          </Text>
          <StandingMark group={group} />
        </Row>
        <Row gap={12} align="start">
          {family ? <FamilyOf family={family} /> : null}
          <Text style={{ flex: 1 }}>{first.reason}</Text>
        </Row>
        {chains.length > 1 ? (
          <Text kind="small" tone="soft">
            {`${chains.length} chains with the same sequence and the same match: decided together.`}
          </Text>
        ) : null}
        <ChainFacts projectId={projectId} chain={first} />
        <MapExceptions
          key={`exceptions ${first.chainId}`}
          projectId={projectId}
          chain={first}
          copies={chains.length}
          family={family}
        />
        {isProtein && deciding ? (
          <Stack gap={8}>
            <Caption level={3}>
              {standing === 'decided' || standing === 'left out' ? 'Decide again' : 'Decide'}
            </Caption>
            <ChainDecision
              key={`${first.chainId} ${standing}`}
              projectId={projectId}
              group={group}
              families={families}
              deciding={deciding}
              isPrimary={isPrimary}
            />
          </Stack>
        ) : null}
      </Stack>
    </div>
  );
}
