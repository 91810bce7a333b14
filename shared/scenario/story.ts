import type { ModelChain } from './model';
import { gatherFacts } from './facts';
import { offsetNumberings } from './numberings.data';
import { modelOrganism } from './organisms.data';
import type { ScenarioAlignment, ScenarioFamily, ScenarioResidue, ScenarioStory } from './scenario-types';
import { annotationTexts, mutantTexts, threadTexts, type SiteName } from './story.data';
import { letterOf, residueAtSite, writeResidue } from './truth';

const mark = /\{([^}]+)\}/g;
const residueMark = /^(\S)\.([^@#>]+?)(?:\s*@\s*([^#>]+?))?(?:\s*#\s*([^>]+?))?(?:\s*>\s*([A-Z]))?$/;

/** What the team has written about the generated data: every letter, number and distance in it is computed from the truth. */
export function makeStory(alignments: ScenarioAlignment[], model: ModelChain[]): ScenarioStory {
  const facts = gatherFacts(alignments, model);
  const fill = (text: string) => text.replace(mark, (whole, inner: string) => fillMark(inner) ?? whole);
  const find = ({ family, site, organism = modelOrganism }: SiteName): ScenarioResidue[] => {
    const residue = residueAtSite(alignments, family, site, organism);
    return residue ? [residue] : [];
  };

  function fillMark(inner: string): string | undefined {
    if (inner.startsWith('= ')) return facts.get(inner.slice(2));
    const [, family, site = '', organism, numbering, changed = ''] = residueMark.exec(inner) ?? [];
    const residue = residueAtSite(alignments, family as ScenarioFamily, site, organism);
    if (!residue) return undefined;
    // Without a name, in the numbering people see first: the offset one where the protein has it.
    const offsets = offsetNumberings.filter(
      (known) => known.family === residue.family && known.organism === residue.organism,
    );
    const named = numbering === undefined ? offsets[0] : offsets.find((known) => known.name === numbering);
    if (numbering !== undefined && numbering !== 'sequence' && named === undefined) return undefined;
    const offset = numbering === 'sequence' ? 0 : named?.offset;
    return writeResidue(alignments, residue, offset) + changed;
  }

  return {
    numberings: offsetNumberings,
    annotations: annotationTexts.map(({ sites, ...annotation }) => ({
      ...annotation,
      residues: sites.flatMap(find),
      text: fill(annotation.text),
    })),
    threads: threadTexts.flatMap(({ site, messages }) =>
      find(site).map((residue) => ({
        residue,
        messages: messages.map(([author, text]) => ({ author, text: fill(text) })),
      })),
    ),
    mutants: mutantTexts.map(({ author, changes, reason }) => ({
      author,
      mutations: changes.flatMap(({ site, to }) =>
        find(site).map((residue) => ({ residue, oldLetter: letterOf(alignments, residue), newLetter: to })),
      ),
      reason: fill(reason),
    })),
  };
}
