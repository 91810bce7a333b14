import type { Passport } from '@/shared/contracts/residues';
import { KeyValueList, KeyValueRow } from '@/components/ui';
import { passportRows } from '../passport-text';

/** Each numbering with the residue's label in it, the preferred one first, then its column. */
export function PassportList({ passport }: { passport: Passport }) {
  return (
    <KeyValueList label="Passport">
      {passportRows(passport).map(({ name, value, preferred }) => (
        <KeyValueRow key={name} name={name} value={value} strong={preferred} mono />
      ))}
    </KeyValueList>
  );
}
