import { stringify } from 'csv-stringify/sync';
import type { Mutant } from '../../../shared/contracts';
import { FIGURES_CAUTION, PRIMER_CAUTION } from '../../../shared/sequence/primers/caution';

const columns = [
  'primer',
  'sequence 5′ to 3′',
  'length nt',
  'GC %',
  'melting °C',
  'annealing °C',
  'mutant',
  'family',
  'organism',
  'numbering',
  'codon before',
  'codon after',
  'construct',
  'scheme',
  'proof',
  'limits',
];

/** The chosen design of each mutant, or its best ranked one; one line a primer, the caution first and last. */
export function primerListCsv(mutants: readonly Mutant[], projectName: string, at: Date): string {
  const lines = mutants.flatMap((mutant) => {
    const design = mutant.designs.find((one) => one.chosen) ?? mutant.designs.find((one) => one.proved);
    const residue = mutant.mutations[0]?.residue;
    if (!design || !residue) return [];
    return design.primers.map((primer) => [
      primer.name,
      primer.bases,
      primer.length,
      round(primer.gcPercent),
      round(primer.meltingCelsius),
      round(primer.annealingCelsius),
      mutant.name,
      residue.family,
      residue.organism,
      residue.numbering,
      design.codons.map((codon) => codon.codonFrom).join(' '),
      design.codons.map((codon) => codon.codonTo).join(' '),
      mutant.constructName ?? '',
      design.scheme,
      design.proof,
      design.withinLimits ? 'within limits' : 'a limit is missed: see the checks',
    ]);
  });
  const caution = `${PRIMER_CAUTION} ${FIGURES_CAUTION}`;
  const rows = [[caution], [`Project ${projectName}, ${at.toISOString()}`], columns, ...lines, [caution]];
  // A spreadsheet must not run what a person typed: cells that begin like a formula are made text.
  return stringify(rows, { bom: true, escape_formulas: true, record_delimiter: 'windows' });
}

const round = (value: number | null): number | string => (value === null ? '' : Math.round(value * 10) / 10);
