import { Button } from '@/components/ui';

interface ConfirmReadyProps {
  ready: number;
  /** Protein chains that stay open. */
  left: number;
  isPending: boolean;
  full?: boolean;
  onPress: () => void;
}

/** Confirms all chains that need no look. */
export function ConfirmReady({ ready, left, isPending, full, onPress }: ConfirmReadyProps) {
  const words =
    left > 0
      ? `Confirm ${ready}, leave ${left} open`
      : ready === 1
        ? 'Confirm the one that is ready'
        : `Confirm the ${ready} that are ready`;
  return (
    <Button kind="primary" full={full} busyText={isPending ? 'Confirming' : undefined} onPress={onPress}>
      {words}
    </Button>
  );
}
