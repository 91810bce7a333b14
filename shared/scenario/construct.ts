import { ECOLI_CODON_SHARES } from '../sequence/construct/codon-usage.data';
import { codonsOf } from '../sequence/construct/genetic-code';
import { baseIndex, residueIndex } from '../sequence/positions';
import { modelOrganism } from './organisms.data';
import { makeRandom, type Random } from './random';
import type { ScenarioAlignment, ScenarioCodon, ScenarioConstruct } from './scenario-types';

const name = 'pWindlass-c1';
/** Polyhistidine, a short linker, a tobacco etch virus protease site; the wild-type chain follows without its first Met. */
const tag = 'MGHHHHHHSSGENLYFQG';
const geneticCode = 11;
const flankLengths = { before: 432, after: 418 };
/** Longest run of one base, where the protein leaves a choice; no flank holds the same stretch of bases twice. */
const longestRun = 3;
const longRun = new RegExp(`(.)\\1{${longestRun}}`);
const repeatLength = 9;
const lineWidth = 70;
/** Codons of a smaller share are not used [common practice, no source]. */
const leastShare = 0.1;

/** The lab's DNA for the c subunit of the model organism: invented flanks, tag, linker, coding part by E. coli usage, stop. */
export function makeConstruct(seed: number, alignments: ScenarioAlignment[]): ScenarioConstruct {
  const random = makeRandom(seed * 31 + 101);
  const rows = alignments.find((alignment) => alignment.family === 'c')?.rows ?? [];
  const wildType = rows.find((row) => row.organism === modelOrganism)?.residues ?? '';
  const encoded = tag + wildType.slice(1);
  const before = makeFlank(flankLengths.before, random);
  let written = before;
  const codons = [...encoded, '*'].map((letter, place, letters): ScenarioCodon => {
    const index = place - tag.length + 1;
    const start = baseIndex(written.length);
    const codon = drawCodon(letter, letters[place + 1] ?? '*', written, random);
    written += codon;
    return { start, bases: codon, letter, index: index >= 1 && letter !== '*' ? residueIndex(index) : null };
  });
  const coding = codons.map((codon) => codon.bases).join('');
  const bases = before + coding + makeFlank(flankLengths.after, random);
  return {
    name,
    fileName: `${name}.fa`,
    text: writeFasta(`${name} invented, c subunit of ${modelOrganism} with a removable tag`, bases),
    bases,
    circular: false,
    codingStart: baseIndex(before.length),
    codingLength: coding.length,
    geneticCode,
    family: 'c',
    organism: modelOrganism,
    encoded,
    codons,
  };
}

/**
 * A codon drawn by its share in the host; rare ones left out, and those that make a long run of one base with what is written or
 * leave the next residue no other way.
 */
function drawCodon(letter: string, next: string, written: string, random: Random): string {
  const common = commonCodons(letter);
  const smooth = common.filter((codon) => {
    const grown = written + codon;
    return runsOn(written, codon) && commonCodons(next).some((following) => runsOn(grown, following));
  });
  const usable = smooth.length > 0 ? smooth : common;
  let left = random.fraction() * usable.reduce((sum, codon) => sum + shareOf(codon), 0);
  return usable.find((codon) => (left -= shareOf(codon)) <= 0) ?? usable[0] ?? 'NNN';
}

const shareOf = (codon: string): number => ECOLI_CODON_SHARES[codon] ?? 0;
const commonCodons = (letter: string): string[] =>
  codonsOf(letter, geneticCode).filter((codon) => shareOf(codon) >= leastShare);
const runsOn = (written: string, codon: string): boolean => !longRun.test(written.slice(-longestRun) + codon);

/** Random bases, half G and C, without long runs and without repeats. */
function makeFlank(length: number, random: Random): string {
  let bases = '';
  while (bases.length < length) {
    const grown = bases + random.pick('ACGT');
    const end = grown.slice(-repeatLength);
    const repeated = end.length === repeatLength && bases.includes(end);
    if (!longRun.test(grown.slice(-longestRun - 1)) && !repeated) bases = grown;
  }
  return bases;
}

function writeFasta(header: string, bases: string): string {
  const lines = bases.match(new RegExp(`.{1,${lineWidth}}`, 'g')) ?? [];
  return `>${[header, ...lines].join('\n')}\n`;
}
