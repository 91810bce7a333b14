import { Select } from '@/components/form';
import type { Host } from '@/shared/sequence/construct/codon-choice';
import { hostOptions } from '../condition-words';

/** Whose codon usage chooses the new codon. */
export function HostSelect({ value, onChange }: { value: Host; onChange: (host: Host) => void }) {
  return (
    <Select
      label="Codons as used by"
      options={hostOptions}
      value={value}
      onChange={(chosen) => {
        const host = hostOptions.find((option) => option.value === chosen);
        if (host) onChange(host.value);
      }}
    />
  );
}
