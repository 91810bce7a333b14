import { columnIndex, type ColumnIndex } from '../sequence/positions';
import { isKnownLabel } from './avoided-labels.data';
import { evolve, type Evolved, type Lineage, type Site } from './evolve';
import { familyPlans, type FamilyPlan } from './families.data';
import { offsetNumberings } from './numberings.data';
import { organisms, tree } from './organisms.data';
import { makeRandom } from './random';
import type { ScenarioAlignment, ScenarioAlignmentRow } from './scenario-types';
import { alike, drawFrom } from './substitutions.data';

/** Columns of the file in one line of text. */
const lineWidth = 60;

/** The alignments of the demo's four families, with the true column of each residue. Same seed, same result. */
export function makeAlignments(seed: number): ScenarioAlignment[] {
  return familyPlans.map((plan, ordinal) => {
    const evolved = evolve(plan, tree, makeRandom(seed * 31 + ordinal));
    const columns = siteColumns(plan, evolved.sites);
    for (const { site, organism, letter } of plan.exceptions) {
      const column = columns[site];
      const held = column === undefined ? undefined : evolved.sites[column];
      if (held) evolved.tips.get(organism)?.set(held, letter);
    }
    const rows = organisms.map((organism) => makeRow(plan, evolved, organism));
    return {
      family: plan.family,
      part: plan.part,
      fileName: plan.fileName,
      text: rows.map(writeRow).join(''),
      columnCount: evolved.sites.length,
      rows,
      sites: columns,
    };
  });
}

function siteColumns(plan: FamilyPlan, sites: Site[]): Record<string, ColumnIndex> {
  const columns: Record<string, ColumnIndex> = {};
  for (const block of plan.blocks) {
    for (const [name, offset] of Object.entries(block.sites ?? {})) {
      const place = sites.findIndex((site) => site.block === block.name && site.offset === offset);
      columns[name] = columnIndex(place);
    }
  }
  return columns;
}

function makeRow(plan: FamilyPlan, evolved: Evolved, organism: string): ScenarioAlignmentRow {
  const lineage: Lineage = evolved.tips.get(organism) ?? new Map();
  const held = evolved.sites.filter((site) => lineage.has(site));
  const letters = held.map((site) => lineage.get(site) ?? '');
  clearKnownLabels(plan, organism, held, letters);
  clearExtraSignatures(plan, organism, held, letters);
  const columns = held.map((site) => columnIndex(evolved.sites.indexOf(site)));
  const text = Array.from({ length: evolved.sites.length }, () => '-');
  columns.forEach((column, index) => {
    text[column] = letters[index] ?? '-';
  });
  return {
    organism,
    name: organism.replace(' ', '_'),
    description: `${plan.family} subunit, invented`,
    text: text.join(''),
    residues: letters.join(''),
    columns,
  };
}

/** Whether a letter at an index would be a residue known from the literature, in any numbering the demo offers. */
function isKnown(plan: FamilyPlan, organism: string, letter: string, index: number): boolean {
  const offsets = offsetNumberings
    .filter((numbering) => numbering.family === plan.family && numbering.organism === organism)
    .map((numbering) => numbering.offset);
  return [0, ...offsets].some((offset) => isKnownLabel(plan.family, letter, index + 1 + offset));
}

function clearKnownLabels(plan: FamilyPlan, organism: string, sites: Site[], letters: string[]): void {
  sites.forEach((site, index) => {
    const letter = letters[index] ?? '';
    if (site.fixed || !isKnown(plan, organism, letter, index)) return;
    const others = [...(alike[letter] ?? ''), ...drawFrom[site.surrounding]];
    const other = others.find((candidate) => !isKnown(plan, organism, candidate, index));
    if (other) letters[index] = other;
  });
}

/** A signature that chance made beside the family's own loses one residue to valine (or leucine). */
function clearExtraSignatures(plan: FamilyPlan, organism: string, sites: Site[], letters: string[]): void {
  for (const { 0: text, index: start } of letters.join('').matchAll(plan.signature)) {
    const breaking = [...text].findIndex((_, step) => {
      const changed = `${text.slice(0, step)}V${text.slice(step + 1)}`;
      return !sites[start + step]?.fixed && changed.search(plan.signature) < 0;
    });
    const place = start + breaking;
    if (breaking >= 0) letters[place] = isKnown(plan, organism, 'V', place) ? 'L' : 'V';
  }
}

function writeRow(row: ScenarioAlignmentRow): string {
  const lines = [`>${row.name} ${row.description}`];
  for (let start = 0; start < row.text.length; start += lineWidth) {
    lines.push(row.text.slice(start, start + lineWidth));
  }
  return `${lines.join('\n')}\n`;
}
