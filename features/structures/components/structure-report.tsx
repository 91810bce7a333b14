import type { ReactNode } from 'react';
import type { StructureWithChains } from '@/shared/contracts/structures';
import { PageTitle } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Banner, Caption, counted, Row, Stack, StageScale, Text, Time } from '@/components/ui';
import { countOf, standings } from '@/features/maps';
import { FoundWhileReading } from '@/features/uploads';
import { ChainList, type ChainsProps } from './chain-list';
import { ChainTable } from './chain-table';
import { JustConfirmed } from './just-confirmed';

interface StructureReportProps extends ChainsProps {
  structure: StructureWithChains;
  mayConfirm: boolean;
  problem: string | null;
  /** Whether chains were confirmed just now. */
  isConfirmed: boolean;
  /** The upload it came with, where its warnings stand beside the text of the file. */
  uploadHref: string | undefined;
  /** The main button, on a wide screen. */
  confirm: ReactNode;
}

/** A structure, how far its map is confirmed, and its chains in the order in which they need a person. */
export function StructureReport(props: StructureReportProps) {
  const { structure, mayConfirm, problem, isConfirmed, uploadHref, confirm, groups } = props;
  const layout = useLayout();
  const { name, revision, title, fileName, by, at, waiting, chains, issues } = structure;
  const proteinCount = chains.filter(({ status }) => status !== null).length;
  const share = proteinCount === 0 ? 0 : (proteinCount - waiting) / proteinCount;
  const isDone = waiting === 0;
  const example = chains.find(({ status }) => status === 'confirmed');
  const counts = standings
    .map((standing) => ({ standing, count: countOf(groups, standing) }))
    .filter(({ count }) => count > 0)
    .map(({ standing, count }) => `${count} ${wordOf[standing]}`)
    .join(', ');
  return (
    <Stack gap={16}>
      <Stack gap={4}>
        <PageTitle>{`${name}, revision ${revision}`}</PageTitle>
        {title ? <Text>{title}</Text> : null}
        <Text kind="small" tone="soft">
          {fileName} · uploaded by {by.name}, <Time iso={at} />
        </Text>
      </Stack>
      <StageScale
        stage={isDone ? 'done' : 'confirm'}
        share={share}
        state={isDone ? 'done' : 'waiting'}
        label="Map of the chains"
        sentence={isDone ? undefined : waitingWords(waiting, mayConfirm)}
      />
      {problem ? <Banner kind="danger">{problem}</Banner> : null}
      {isConfirmed && example ? (
        <JustConfirmed example={`${example.authorId}:${example.firstLabel}`} />
      ) : null}
      {layout.hasRail && confirm ? <Row>{confirm}</Row> : null}
      <Stack gap={4}>
        <Caption count={counts}>Chains</Caption>
        {layout.name === 'three' ? <ChainTable {...props} /> : <ChainList {...props} />}
      </Stack>
      <FoundWhileReading issues={issues} uploadHref={uploadHref} />
    </Stack>
  );
}

const wordOf: Record<(typeof standings)[number], string> = {
  choose: 'to choose',
  look: 'to look at',
  ready: 'ready',
  decided: 'decided',
  'left out': 'left out',
  'no protein': 'no protein',
};

function waitingWords(waiting: number, mayConfirm: boolean): string {
  const who = mayConfirm ? 'you, or another curator' : 'a curator';
  return `${counted(waiting, 'protein chain')} ${waiting === 1 ? 'waits' : 'wait'} for ${who}.`;
}
