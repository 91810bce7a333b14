import { useState } from 'react';
import { Caption, IssueList, KeyValueList, KeyValueRow, Stack, Text } from '@/components/ui';
import type { CodingView } from '../coding-view';
import { issueViews } from './refusal';
import { TagWords } from './tag-words';
import { TextPlace } from './text-place';

interface CodingFeedbackProps {
  view: CodingView;
  dna: string;
  codingStart: number;
}

const percent = (share: number) => `${Math.round(share * 1000) / 10} %`;

/** What the DNA reads as from the start that is given, and everything that is doubtful about it. */
export function CodingFeedback({ view, dna, codingStart }: CodingFeedbackProps) {
  const [openKey, setOpenKey] = useState<string>();
  const { first, coding, match } = view;
  const issues = issueViews(view.issues);
  const open = issues.find(({ key }) => key === openKey) ?? issues.find(({ line }) => line !== undefined);
  return (
    <Stack gap={16}>
      {first ? (
        <KeyValueList label="What the coding part reads as">
          <KeyValueRow
            name={`Codon at base ${codingStart}`}
            value={`${first.codon}, reads ${first.encodes}, ${first.isStart ? 'a start codon' : 'no start codon'} of this code`}
          />
          {coding ? (
            <>
              <KeyValueRow name="First residues" value={coding.firstResidues} mono />
              <KeyValueRow name="First stop in frame" value={stopWords(coding.stopBase)} />
              <KeyValueRow
                name="Coding part, in frame"
                value={`${coding.lengthBases} bases, ${coding.residues} residues`}
              />
            </>
          ) : null}
          {match ? (
            <KeyValueRow
              name="The protein"
              value={`${percent(match.coverage)} of it is encoded, ${percent(match.identity)} identical`}
            />
          ) : null}
        </KeyValueList>
      ) : null}
      {match && match.tags.length > 0 ? <TagWords tags={match.tags} /> : null}
      {issues.length > 0 ? (
        <Stack gap={8}>
          <Caption count={issues.length}>To look at</Caption>
          <IssueList
            label="What is wrong or doubtful in the DNA"
            issues={issues}
            selectedKey={open?.line === undefined ? undefined : open.key}
            onOpen={({ key }) => setOpenKey(key)}
          />
          {open?.line === undefined ? null : <TextPlace text={dna} line={open.line} column={open.column} />}
        </Stack>
      ) : null}
      {view.bases ? (
        <Text tone="soft">{`${view.bases.length} bases in all. Nothing is stored yet.`}</Text>
      ) : null}
    </Stack>
  );
}

const stopWords = (stopBase: number | null) => (stopBase === null ? 'none' : `at base ${stopBase}`);
