import { useState } from 'react';
import type { ChainCopy, Passport } from '@/shared/contracts/residues';
import { wordsForCode } from '@/components/residue';
import { face } from '@/components/theme';
import { Button, Caption, Empty, Link, Mark, Table, type TableColumn } from '@/components/ui';
import { structurePath } from '@/client/paths';

const atFirst = 12;
const stateWords: Record<ChainCopy['state'], string> = {
  observed: 'observed',
  missing: 'no coordinates',
  alternates: 'alternate places',
};

/** How many of the copies have coordinates for the residue. */
export const seenCopies = (copies: readonly ChainCopy[]): number =>
  copies.filter(({ state }) => state !== 'missing').length;

function Letter({ copy, own }: { copy: ChainCopy; own: string }) {
  if (copy.letter === null) return <>–</>;
  const letter = <span style={{ fontFamily: face.mono }}>{copy.letter}</span>;
  if (copy.letter === own) return letter;
  const says = `${wordsForCode(copy.letter).threeLetter}, not ${wordsForCode(own).threeLetter}`;
  return (
    <>
      {letter}{' '}
      <Mark tone={copy.engineered ? 'soft' : 'warn'}>{copy.engineered ? `engineered, ${says}` : says}</Mark>
    </>
  );
}

const columnsOf = (projectId: string, own: string): TableColumn<ChainCopy>[] => [
  {
    key: 'copy',
    header: 'chain : author number',
    rowHeader: true,
    cell: ({ authorId, label }) => (
      <span style={{ fontFamily: face.mono }}>{label === null ? authorId : `${authorId}:${label}`}</span>
    ),
  },
  {
    key: 'structure',
    header: 'structure',
    cell: ({ structureId, structureName }) => (
      <Link href={structurePath(projectId, structureId)}>{structureName}</Link>
    ),
  },
  { key: 'letter', header: 'letter', cell: (copy) => <Letter copy={copy} own={own} /> },
  { key: 'state', header: 'seen', cell: ({ state }) => stateWords[state] },
  {
    key: 'map',
    header: 'map',
    cell: ({ confirmed }) => (confirmed ? 'confirmed' : 'proposed'),
  },
];

/** The residue in every chain that is mapped to its protein, with its author number there. */
export function CopiesSection({ projectId, passport }: { projectId: string; passport: Passport }) {
  const { copies, residue } = passport;
  const [all, setAll] = useState(false);
  const shown = all ? copies : copies.slice(0, atFirst);
  return (
    <section aria-label="Copies">
      <Caption count={copies.length > 0 ? `${seenCopies(copies)} of ${copies.length} seen` : undefined}>
        Copies
      </Caption>
      {copies.length === 0 ? (
        <Empty title="In no chain yet">
          A structure whose chain is mapped to this protein shows the residue with its author number.
        </Empty>
      ) : (
        <Table
          caption="Copies of this residue"
          columns={columnsOf(projectId, residue.letter)}
          rows={shown}
          keyOf={({ chainId }) => chainId}
        />
      )}
      {shown.length < copies.length ? (
        <Button kind="quiet" onPress={() => setAll(true)}>
          {`Show ${copies.length - shown.length} more`}
        </Button>
      ) : null}
    </section>
  );
}
