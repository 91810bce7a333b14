import { useEffect, useRef, useState, type CSSProperties, type ReactNode } from 'react';
import MessageSquare from 'lucide-react-native/icons/message-square';
import { color, useLayout } from '@/components/theme';
import { Button, Caption, Row, Stack, Text, Time } from '@/components/ui';
import { constructPath, threadPath } from '@/client/paths';
import { useMay } from '@/features/projects';
import type { Construct, Design, Mutant } from '@/shared/contracts/plans';
import type { useMutantActs } from '../use-mutant-acts';
import { Alternatives } from './alternatives';
import { Caution } from './caution';
import { DesignForm } from './design-form';
import { MutantActions } from './mutant-actions';
import { Refusal } from './refusal';
import { StaleNotice } from './stale-notice';

interface AlternativesPaneProps {
  projectId: string;
  mutant: Mutant;
  design: Design | undefined;
  constructs: readonly Construct[];
  acts: ReturnType<typeof useMutantActs>;
  onShow: (design: Design) => void;
}

/** Which designs there are, why the mutant is wanted, and the next step, with the caution before it. */
export function AlternativesPane(props: AlternativesPaneProps) {
  const { projectId, mutant, design, constructs, acts, onShow } = props;
  const { hasRail } = useLayout();
  const may = useMay(projectId);
  const [asked, setAsked] = useState(false);
  const hasDesigns = mutant.designs.length > 0;
  const isStale = acts.problem?.status === 412;
  return (
    <Stack gap={16}>
      {hasDesigns ? (
        <div className="no-print">
          <Alternatives designs={mutant.designs} shownId={design?.id} onShow={onShow} />
        </div>
      ) : null}
      <Purpose projectId={projectId} mutant={mutant} />
      {may('plan') && hasDesigns && !asked ? (
        <Button onPress={() => setAsked(true)}>Design for another construct or host</Button>
      ) : null}
      {may('plan') && (!hasDesigns || asked) ? (
        <DesignForm
          projectId={projectId}
          mutant={mutant}
          constructs={constructs}
          busy={acts.isDesigning}
          onDesign={(request) => {
            setAsked(false);
            acts.design(request);
          }}
        />
      ) : null}
      <NextStep isStuck={hasRail}>
        {acts.problem ? (
          <InSight>
            <Notice acts={acts} />
          </InSight>
        ) : null}
        <Caution />
        {hasRail && !isStale ? (
          <MutantActions
            projectId={projectId}
            design={design}
            isChoosing={acts.isChoosing}
            onChoose={acts.choose}
          />
        ) : null}
      </NextStep>
    </Stack>
  );
}

/** Why the last act was not done. */
function Notice({ acts }: Pick<AlternativesPaneProps, 'acts'>) {
  const { problem, last } = acts;
  if (last && problem?.status === 412)
    return <StaleNotice problem={problem} seen={last.seen} onAgain={last.repeat} onLeave={acts.leave} />;
  return <Refusal outcome={acts.refusedWhat} problem={problem} />;
}

/** Comes into sight when it appears: its button may stand elsewhere. */
function InSight({ children }: { children: ReactNode }) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    // Some browsers answer with a promise, which is no clean-up.
    void box.current?.scrollIntoView({ block: 'nearest' });
  }, []);
  return <div ref={box}>{children}</div>;
}

/** The caution with its buttons; on a wide screen always in sight, however long the list above is. */
function NextStep({ isStuck, children }: { isStuck: boolean; children: ReactNode }) {
  const stuck: CSSProperties = {
    position: 'sticky',
    bottom: -18,
    margin: '0 -20px -18px',
    padding: '12px 20px 18px',
    borderTop: `1px solid ${color.lineRule}`,
    background: color.paper,
  };
  return (
    <div style={isStuck ? stuck : undefined}>
      <Stack gap={8}>{children}</Stack>
    </div>
  );
}

function Purpose({ projectId, mutant }: { projectId: string; mutant: Mutant }) {
  return (
    <Stack gap={8}>
      <Caption>What it is for</Caption>
      <Text>{mutant.reason || 'No reason was written.'}</Text>
      <Text kind="meta" tone="soft">
        {`${mutant.state}, by ${mutant.by.name}, `}
        <Time iso={mutant.at} />
      </Text>
      {mutant.constructId ? <Text>{`In the construct ${mutant.constructName ?? ''}.`}</Text> : null}
      <Row wrap>
        {mutant.constructId ? (
          <Button href={constructPath(projectId, mutant.constructId)}>Open the construct</Button>
        ) : null}
        <Button icon={MessageSquare} href={threadPath(projectId, { kind: 'mutant', id: mutant.id })}>
          Discuss this mutant
        </Button>
      </Row>
    </Stack>
  );
}
