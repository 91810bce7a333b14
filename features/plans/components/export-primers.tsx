import { useState } from 'react';
import Download from 'lucide-react-native/icons/download';
import { Banner, Button, Dialog, Stack, type ButtonKind } from '@/components/ui';
import { asApiProblem } from '@/client/problem';
import { useMay } from '@/features/projects';
import { downloadPrimerList } from '../use-plans';
import { Caution } from './caution';

interface ExportState {
  busy: boolean;
  savedAs: string | null;
  refusal: string | null;
}

function useExport(projectId: string, onSaved?: () => void) {
  const [state, setState] = useState<ExportState>({ busy: false, savedAs: null, refusal: null });
  const run = async () => {
    setState({ busy: true, savedAs: null, refusal: null });
    try {
      const savedAs = await downloadPrimerList(projectId);
      setState({ busy: false, savedAs, refusal: null });
      onSaved?.();
    } catch (error) {
      setState({ busy: false, savedAs: null, refusal: asApiProblem(error).message });
    }
  };
  return { ...state, run };
}

interface ExportButtonProps {
  projectId: string;
  kind?: ButtonKind;
  /** Why there is nothing to export. */
  offReason?: string;
  full?: boolean;
  /** After the file is saved; a phone shows no sign of a download. */
  onSaved?: () => void;
}

/** Saves the project's primers as CSV. Stands below a <Caution>. */
export function ExportButton({ projectId, kind, offReason, full, onSaved }: ExportButtonProps) {
  const { busy, savedAs, refusal, run } = useExport(projectId, onSaved);
  const may = useMay(projectId);
  if (!may('export')) return null;
  return (
    <Stack gap={8}>
      <Button
        kind={kind}
        icon={Download}
        offReason={offReason}
        busyText={busy ? 'Writing the list' : undefined}
        full={full}
        onPress={() => void run()}
      >
        Export primers
      </Button>
      {savedAs ? <Banner kind="good">{`Saved as ${savedAs}.`}</Banner> : null}
      {refusal ? <Banner kind="danger">{refusal}</Banner> : null}
    </Stack>
  );
}

/** The same where there is no room for the caution beside it: it is shown first. */
export function ExportWithCaution({ projectId, kind }: Pick<ExportButtonProps, 'projectId' | 'kind'>) {
  const [open, setOpen] = useState(false);
  const may = useMay(projectId);
  if (!may('export')) return null;
  const close = () => setOpen(false);
  return (
    <>
      <Button kind={kind} icon={Download} full onPress={() => setOpen(true)}>
        Export primers
      </Button>
      <Dialog
        open={open}
        title="Export the primers of this project"
        onClose={close}
        actions={
          <>
            <Button onPress={close}>Not now</Button>
            <ExportButton projectId={projectId} kind="primary" onSaved={close} />
          </>
        }
      >
        <Caution />
      </Dialog>
    </>
  );
}
