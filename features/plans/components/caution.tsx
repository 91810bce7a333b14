import { Banner } from '@/components/ui';
import { calculatedCaution, primerCaution } from '@/shared/contracts/plans';

/** Stands wherever primers are listed, chosen or exported. */
export function Caution() {
  return (
    <Banner kind="warn" announce={false}>
      {primerCaution} {calculatedCaution}
    </Banner>
  );
}
