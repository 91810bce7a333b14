// The invented consortium, and who somebody is there.
import { people, projectName } from '@/shared/scenario/people.data';
import { makeScenario } from '@/shared/scenario/scenario';
import { residueAtSite, writeResidue } from '@/shared/scenario/truth';
import { demoPassword } from '@/tests/support/server-process';
import type { Visitor } from './visitor';
import { link, see, signIn } from './walk';

/** An address of the generator's own data: `cE64` for the residue of the model organism at a named site. */
export function addressOf(family: 'c' | 'a', site: string): string {
  const { alignments } = makeScenario();
  const residue = residueAtSite(alignments, family, site);
  if (!residue) throw new Error(`The demo has no ${site} in ${family}.`);
  return writeResidue(alignments, residue);
}

/** What each organism carries at a named site: `c E64`, organism. */
export function equivalentsOf(family: 'c' | 'a', site: string): [plate: string, organism: string][] {
  const { alignments } = makeScenario();
  const rows = alignments.find((one) => one.family === family)?.rows ?? [];
  return rows.flatMap(({ organism }) => {
    const residue = residueAtSite(alignments, family, site, organism);
    if (!residue) return [];
    return [[writeResidue(alignments, residue).replace(family, `${family} `), organism] as [string, string]];
  });
}

/** Signs in as one of them and opens the demo. */
export async function enterDemo(visitor: Visitor, name: string): Promise<void> {
  const email = people.find((person) => person.name === name)?.email;
  if (!email) throw new Error(`Nobody in the demo is called ${name}.`);
  await signIn(visitor, email, demoPassword);
  await link(visitor.page, new RegExp(`^${projectName} `)).click();
  await see(visitor.page.getByRole('navigation', { name: 'Places' }));
}
