import { useState } from 'react';
import { Slot, usePathname, useRouter } from 'expo-router';
import PencilRuler from 'lucide-react-native/icons/pencil-ruler';
import ScrollText from 'lucide-react-native/icons/scroll-text';
import Search from 'lucide-react-native/icons/search';
import { projectParams } from '@/shared/contracts/common';
import type { OwnProject } from '@/shared/contracts/projects';
import { AppShell, EntryFrame, type Place } from '@/components/layout';
import { useLayout, usePrinting } from '@/components/theme';
import { Banner, IconButton, Link, NothingHere, ReadView, Stack } from '@/components/ui';
import {
  findPath,
  historyPath,
  locatePath,
  peoplePath,
  planPath,
  projectsPath,
  settingsPath,
  threadsPath,
} from '@/client/paths';
import { useKeys } from '@/client/use-keys';
import { useConnection } from '@/client/use-live';
import { useRouteParams } from '@/client/use-route-params';
import { usePerson, useSignOut } from '@/features/auth';
import { useLiveProject } from '@/features/projects';
import { LocatorBox } from '@/features/residues';
import { KeysDialog } from './components/keys-dialog';
import { LineNotice } from './components/line-notice';
import { PrintedWords } from './components/printed-words';
import { RailFoot } from './components/rail-foot';
import { standingWords } from './components/standing-words';
import { WhoIsHere } from './components/who-is-here';
import { useLineNews } from './use-line-news';

/** Around all screens of a project: its places, the locator, who is here, and the line to the server. */
export function ProjectFrame() {
  const given = useRouteParams(projectParams);
  return given ? <OpenProject key={given.projectId} projectId={given.projectId} /> : <NoProject />;
}

function OpenProject({ projectId }: { projectId: string }) {
  const project = useLiveProject(projectId);
  if (project.data) return <Shell project={project.data} />;
  if (project.error?.status === 404) return <NoProject />;
  return (
    <EntryFrame>
      <ReadView of={project} what="the project">
        {() => null}
      </ReadView>
    </EntryFrame>
  );
}

function NoProject() {
  return (
    <EntryFrame>
      <NothingHere action={<Link href={projectsPath()}>My projects</Link>} />
    </EntryFrame>
  );
}

function placesOf(projectId: string): Place[] {
  return [
    { key: 'find', label: 'Find', icon: Search, href: findPath(projectId) },
    { key: 'threads', label: 'Threads', icon: ScrollText, href: threadsPath(projectId) },
    { key: 'plan', label: 'Plan', icon: PencilRuler, href: planPath(projectId) },
  ];
}

/** The place an address belongs to; people, settings and history belong to none. */
function placeOf(path: string, projectId: string): string | undefined {
  const isUnder = (start: string) => path === start || path.startsWith(`${start}/`);
  if (isUnder(threadsPath(projectId))) return 'threads';
  if (isUnder(planPath(projectId))) return 'plan';
  return [peoplePath, settingsPath, historyPath].some((of) => isUnder(of(projectId))) ? undefined : 'find';
}

/** The locator's box where one is on the page, else its own page. */
function openLocator(elsewhere: () => void): void {
  const box = document.querySelector<HTMLInputElement>('[role="search"] input');
  if (!box || box.offsetParent === null) return elsewhere();
  box.focus();
  box.select();
}

function Shell({ project }: { project: OwnProject }) {
  const { id: projectId } = project;
  const router = useRouter();
  const path = usePathname();
  const person = usePerson();
  const signOut = useSignOut();
  const news = useLineNews();
  const connection = useConnection();
  const { hasRail } = useLayout();
  const isPrinting = usePrinting();
  const [showsKeys, setShowsKeys] = useState(false);
  useKeys({
    '/': () => openLocator(() => router.push(locatePath(projectId) as never)),
    '?': () => setShowsKeys(true),
  });
  const hasNotice = news.kind !== 'none' || signOut.error !== null;
  const notice = (
    <Stack gap={8} style={{ padding: 8 }}>
      <LineNotice news={news} />
      {signOut.error ? <Banner kind="danger">{`Not signed out: ${signOut.error.message}`}</Banner> : null}
    </Stack>
  );
  return (
    <AppShell
      places={placesOf(projectId)}
      currentPlace={placeOf(path, projectId)}
      homeHref={projectsPath()}
      project={{ name: project.name, detail: project.teamName, href: peoplePath(projectId) }}
      locator={<LocatorBox projectId={projectId} />}
      people={<WhoIsHere projectId={projectId} />}
      railFoot={
        <RailFoot
          name={person?.name ?? ''}
          onKeys={() => setShowsKeys(true)}
          onSignOut={() => signOut.mutate()}
        />
      }
      phoneEnd={<IconButton icon={Search} label="Find a residue" href={locatePath(projectId)} />}
      notice={hasNotice ? notice : undefined}
      standing={
        isPrinting ? (
          <PrintedWords project={project} by={person?.name ?? ''} />
        ) : (
          standingWords(project.invented, connection, !hasRail)
        )
      }
    >
      <Slot />
      <KeysDialog open={showsKeys} onClose={() => setShowsKeys(false)} />
    </AppShell>
  );
}
