import { useId, useState } from 'react';
import type { Passport } from '@/shared/contracts/residues';
import { Stack, Tabs } from '@/components/ui';
import { ColumnTable } from './column-table';
import { CopiesSection } from './copies-section';

/** Where the residue comes from: the rows of its column, or its copies in the structures. */
export function SourcePane({ projectId, passport }: { projectId: string; passport: Passport }) {
  const panelId = useId();
  const [tab, setTab] = useState('column');
  const items = [
    { key: 'column', label: 'Column' },
    { key: 'copies', label: 'Copies', count: passport.copies.length },
  ];
  return (
    // On paper the page itself holds the column and the copies.
    <div className="no-print">
      <Stack gap={16}>
        <Tabs items={items} current={tab} onChange={setTab} label="Source" panelId={panelId} />
        <div id={panelId} role="tabpanel">
          {tab === 'column' ? (
            <ColumnTable projectId={projectId} passport={passport} all />
          ) : (
            <CopiesSection projectId={projectId} passport={passport} />
          )}
        </div>
      </Stack>
    </div>
  );
}
