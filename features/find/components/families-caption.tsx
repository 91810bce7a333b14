import { useState } from 'react';
import Plus from 'lucide-react-native/icons/plus';
import { Button, Caption } from '@/components/ui';
import { useMay } from '@/features/projects';
import { AddFamily } from './add-family';

/** The heading of the families, with the way to add one for whoever may. */
export function FamiliesCaption({ projectId, count }: { projectId: string; count: string }) {
  const may = useMay(projectId);
  const [adds, setAdds] = useState(false);
  const button = (
    <Button kind="quiet" icon={Plus} onPress={() => setAdds(true)}>
      Add a family
    </Button>
  );
  return (
    <>
      <Caption count={count} action={may('edit family') ? button : undefined}>
        Families
      </Caption>
      <AddFamily projectId={projectId} open={adds} onClose={() => setAdds(false)} />
    </>
  );
}
