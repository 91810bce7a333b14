import { Banner } from '@/components/ui';
import { FIGURES_CAUTION, PRIMER_CAUTION } from '@/shared/sequence/primers/caution';

/** Stands wherever primers are listed, chosen or exported. */
export function Caution() {
  return (
    <Banner kind="warn" announce={false}>
      {PRIMER_CAUTION} {FIGURES_CAUTION}
    </Banner>
  );
}
