import { useRef, useState } from 'react';
import { useRouter, type Href } from 'expo-router';
import PinIcon from 'lucide-react-native/icons/pin';
import Reply from 'lucide-react-native/icons/reply';
import { z } from 'zod';
import { residueParams, type Passport } from '@/shared/contracts/residues';
import { Panes, Screen, type PaneItem } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Button, NothingHere, ReadView } from '@/components/ui';
import { findPath, residuePath, threadPath } from '@/client/paths';
import { useKeys } from '@/client/use-keys';
import { useRouteParams } from '@/client/use-route-params';
import { NewPin } from '@/features/annotations';
import { useMay } from '@/features/projects';
import { ThreadPanel } from '@/features/threads';
import { AddressField } from '../components/address-field';
import { seenCopies } from '../components/copies-section';
import { ResiduePage } from '../components/residue-page';
import { SourcePane } from '../components/source-pane';
import { usePassport } from '../use-residues';

const screenParams = residueParams.extend({ becomes: z.string().max(4).optional() });
type Params = z.output<typeof screenParams>;

/** One residue, with where it comes from and what is said about it. */
export function ResidueScreen() {
  const params = useRouteParams(screenParams);
  if (params) return <OneResidue key={`${params.proteinId}:${params.residueIndex}`} {...params} />;
  return (
    <Screen title="Residue">
      <NothingHere />
    </Screen>
  );
}

function OneResidue(params: Params) {
  const { projectId, proteinId, residueIndex } = params;
  const passport = usePassport(projectId, proteinId, residueIndex);
  if (passport.data) return <ResidueView {...params} passport={passport.data} />;
  return (
    <Screen title="Residue" backHref={findPath(projectId)}>
      <ReadView of={passport} what="the residue">
        {() => null}
      </ReadView>
    </Screen>
  );
}

function titleItems({ residue, column, copies }: Passport) {
  return [
    {
      key: 'numbering',
      label: 'Numbering',
      value: (
        <>
          {residue.numbering}, <em>{residue.organism}</em>
        </>
      ),
    },
    {
      key: 'alignment',
      label: 'Alignment',
      value: column ? `${column.alignmentName}, revision ${column.revision}` : 'in no row',
    },
    { key: 'copies', label: 'Copies seen', value: `${seenCopies(copies)} of ${copies.length}` },
  ];
}

function ResidueView({
  projectId,
  proteinId,
  residueIndex,
  becomes,
  passport,
}: Params & { passport: Passport }) {
  const { hasRail } = useLayout();
  const router = useRouter();
  const may = useMay(projectId);
  const [isPinning, setIsPinning] = useState(false);
  const threadPane = useRef<HTMLDivElement>(null);
  const subject = { kind: 'residue', proteinId, residueIndex } as const;
  const { residue, previous, next } = passport;
  const reply = () => {
    const composer = threadPane.current?.querySelector('textarea');
    if (composer) composer.focus();
    else router.push(threadPath(projectId, subject) as Href);
  };
  const walk = (to: Passport['next']) => {
    if (to) router.replace(residuePath(projectId, to) as Href);
  };
  useKeys({
    '[': () => walk(previous),
    ']': () => walk(next),
    ...(may('annotate') ? { p: () => setIsPinning(true) } : null),
    r: reply,
  });
  const pin = () => setIsPinning(true);
  const panes: PaneItem[] = [
    {
      key: 'source',
      label: 'Source',
      widthPixels: 424,
      hideWhenStacked: true,
      content: <SourcePane projectId={projectId} passport={passport} />,
    },
    {
      key: 'residue',
      label: 'Residue',
      content: (
        <ResiduePage
          projectId={projectId}
          passport={passport}
          becomes={becomes}
          onPin={pin}
          hasSource={hasRail}
        />
      ),
    },
    {
      key: 'thread',
      label: 'Thread',
      widthPixels: 380,
      content: (
        <div ref={threadPane} className="frame" style={{ height: hasRail ? '100%' : undefined }}>
          <ThreadPanel projectId={projectId} subject={subject} kind={hasRail ? 'pane' : 'read'} />
        </div>
      ),
    },
  ];
  const actions = (
    <>
      <Button icon={Reply} onPress={reply}>
        {may('comment') ? 'Reply' : 'Thread'}
      </Button>
      {may('annotate') ? (
        <Button kind="primary" icon={PinIcon} onPress={pin}>
          Pin here
        </Button>
      ) : null}
    </>
  );
  return (
    <Screen
      kind="panes"
      title={`${residue.family} ${residue.letter}${residue.label}`}
      backHref={findPath(projectId)}
      items={titleItems(passport)}
      actions={actions}
    >
      <Panes name="residue" panes={panes} />
      <NewPin
        projectId={projectId}
        residue={residue}
        open={isPinning}
        onClose={() => setIsPinning(false)}
        partnerField={(field) => (
          <AddressField projectId={projectId} label="Second residue, for a pair" {...field} />
        )}
      />
    </Screen>
  );
}
