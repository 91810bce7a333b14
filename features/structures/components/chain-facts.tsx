import type { ChainMap } from '@/shared/contracts/maps';
import { countWords, KeyValueList, KeyValueRow, Link, Row, Stack, Text } from '@/components/ui';
import { proteinPath } from '@/client/paths';
import { authorShift, CoverageStrip, percentWords, shiftWords, stretchWords } from '@/features/maps';
import { runnerUpName, runnerUpWords } from '../chain-words';

/** What is known of a chain and of how it lies on its protein. */
export function ChainFacts({ projectId, chain }: { projectId: string; chain: ChainMap }) {
  const { proteinId, identity, coverage, segments, proteinLength } = chain;
  const shift = authorShift(chain);
  const declared = chain.declaredLength === null ? '' : ` of ${chain.declaredLength} declared`;
  const isMapped = proteinId !== null && segments.length > 0;
  return (
    <Stack gap={8}>
      {isMapped ? (
        <div>
          <CoverageStrip segments={segments} proteinLength={proteinLength} />
          <Row justify="between">
            <Text kind="meta" tone="soft">
              1
            </Text>
            <Text
              kind="meta"
              tone="soft"
            >{`${proteinLength ?? ''}, places in the sequence of the protein`}</Text>
          </Row>
        </div>
      ) : null}
      <KeyValueList label="The chain and its protein">
        {proteinId === null ? null : (
          <KeyValueRow
            name="protein"
            value={
              <Link href={proteinPath(projectId, proteinId)} className="lone-link">
                {chain.organism}
              </Link>
            }
          />
        )}
        {identity === null ? null : <KeyValueRow name="identity" mono value={percentWords(identity)} />}
        {coverage === null ? null : (
          <KeyValueRow name="of the chain on the protein" mono value={percentWords(coverage)} />
        )}
        {isMapped ? (
          <KeyValueRow name="places in its sequence" mono value={stretchWords(segments, proteinLength)} />
        ) : null}
        <KeyValueRow name="residues seen" mono value={`${chain.observedLength}${declared}`} />
        {chain.missingCount > 0 ? (
          <KeyValueRow
            name="declared, not in the coordinates"
            mono
            value={countWords(chain.missingCount, 'residue')}
          />
        ) : null}
        {chain.firstLabel ? (
          <KeyValueRow name="author numbers" mono value={`${chain.firstLabel} to ${chain.lastLabel}`} />
        ) : null}
        {isMapped ? (
          <KeyValueRow
            name="author number, at both ends"
            value={shift === null ? 'no one shift from the sequence' : shiftWords(shift)}
          />
        ) : null}
        {chain.kind === 'protein' ? (
          <KeyValueRow name={runnerUpName(chain)} value={runnerUpWords(chain)} />
        ) : null}
        {chain.decidedBy ? (
          <KeyValueRow name={`${chain.status ?? ''} by`} value={chain.decidedBy.name} />
        ) : null}
      </KeyValueList>
    </Stack>
  );
}
