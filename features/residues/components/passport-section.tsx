import type { Passport } from '@/shared/contracts/residues';
import { Caption, CopyButton, counted } from '@/components/ui';
import { passportText } from '../passport-text';
import { PassportList } from './passport-list';

/** Everything the residue is called. */
export function PassportSection({ passport }: { passport: Passport }) {
  const { labels, equivalents, copies } = passport;
  const counts = [
    counted(labels.length, 'numbering'),
    counted(equivalents.length, 'equivalent'),
    counted(copies.length, 'copy', 'copies'),
  ];
  return (
    <section aria-label="Passport">
      <Caption
        count={counts.join(', ')}
        action={
          <CopyButton text={passportText(passport)} label="Copy the passport as text">
            Copy
          </CopyButton>
        }
      >
        Passport
      </Caption>
      <PassportList passport={passport} />
    </section>
  );
}
