import { useState } from 'react';
import Download from 'lucide-react-native/icons/download';
import { Banner, Button, Dialog, Stack, type ButtonKind } from '@/components/ui';
import { asApiProblem } from '@/client/problem';
import { useMay } from '@/features/projects';
import { downloadPrimerList } from '../use-plans';
import { Caution } from './caution';

function useExport(projectId: string) {
  const [state, setState] = useState<{ busy: boolean; refusal: string | null }>({
    busy: false,
    refusal: null,
  });
  const run = async () => {
    setState({ busy: true, refusal: null });
    try {
      await downloadPrimerList(projectId);
      setState({ busy: false, refusal: null });
    } catch (error) {
      setState({ busy: false, refusal: asApiProblem(error).message });
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
}

/** Saves the project's primers as CSV. Stands below a <Caution>. */
export function ExportButton({ projectId, kind, offReason, full }: ExportButtonProps) {
  const { busy, refusal, run } = useExport(projectId);
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
            <ExportButton projectId={projectId} kind="primary" />
          </>
        }
      >
        <Caution />
      </Dialog>
    </>
  );
}
