import { isGap } from '../alphabet';
import type { IssueList } from '../issue-list';
import { shown, type FastaRecord } from './fasta-records';

/** Fewest letters from which DNA is told from protein. */
const MIN_LETTERS_FOR_DNA = 24;
/** From this part of letters A, C, G, T, U, N on, rows count as DNA [common practice, no source]. */
const DNA_FRACTION = 0.9;

/** The width most rows have; on a tie the one met first. */
function commonWidth(records: readonly FastaRecord[]): number {
  const counts = new Map<number, number>();
  for (const { text } of records) counts.set(text.length, (counts.get(text.length) ?? 0) + 1);
  let best = records[0]?.text.length ?? 0;
  for (const [width, count] of counts) if (count > (counts.get(best) ?? 0)) best = width;
  return best;
}

/** Reports rows whose width differs: `rows-not-aligned` once for a plain list of sequences, `row-length` for each. */
export function checkWidths(records: readonly FastaRecord[], issues: IssueList): number {
  const width = commonWidth(records.filter((record) => record.text !== ''));
  const odd = records.filter((record) => record.text !== '' && record.text.length !== width);
  const first = odd[0];
  if (first === undefined) return width;
  if (records.every((record) => !/[-.~]/.test(record.text)))
    issues.error(
      'rows-not-aligned',
      'The rows have different lengths and no gaps: these sequences are not aligned yet. Align them first, then upload the aligned file.',
      { line: first.line, column: 1 },
    );
  const agreeing = records.filter((record) => record.text.length === width).length;
  const cut = odd.length === 1 && first === records.at(-1) && first.text.length < width;
  for (const record of odd) {
    const found = `Row ${shown(record.name)} has ${record.text.length} columns`;
    const wanted =
      agreeing > 1 ? `${agreeing} of ${records.length} rows have ${width}` : `another has ${width}`;
    const hint = cut ? ' It is the last row: was the file cut short?' : '';
    const which = record === first && odd.length > 1 ? ' This is the first row that differs.' : '';
    issues.error('row-length', `${found}; ${wanted}.${which}${hint}`, { line: record.line, column: 1 });
  }
  return width;
}

/** Reports names met before (`name-duplicate`) and equal residues under another name (`rows-equal`, a warning). */
export function checkRepeats(records: readonly FastaRecord[], issues: IssueList): void {
  const lineOfName = new Map<string, number>();
  const counts = new Map<string, number>();
  const firstOfResidues = new Map<string, FastaRecord>();
  for (const record of records) {
    const place = { line: record.line, column: 1 };
    const earlier = lineOfName.get(record.name);
    if (record.name !== '' && earlier !== undefined) {
      const count = (counts.get(record.name) ?? 1) + 1;
      counts.set(record.name, count);
      const message = `The name ${shown(record.name)} stands already in line ${earlier}. Rename one, for example by adding _${count}.`;
      issues.error('name-duplicate', message, place);
    } else lineOfName.set(record.name, record.line);
    const residues = record.text.replace(/[-.~]/g, '').toUpperCase();
    const twin = firstOfResidues.get(residues);
    if (residues === '') continue;
    if (twin === undefined) firstOfResidues.set(residues, record);
    else if (twin.name !== record.name)
      issues.warning(
        'rows-equal',
        `Rows ${shown(twin.name)} and ${shown(record.name)} hold the same residues.`,
        place,
      );
  }
}

/** Reports rows without residues: `row-empty` (nothing after the name), `row-without-residues` (gaps alone). */
export function checkEmptyRows(records: readonly FastaRecord[], issues: IssueList): void {
  for (const { name, text, line } of records) {
    const place = { line, column: 1 };
    if (text === '') issues.error('row-empty', `Nothing follows the name ${shown(name)}.`, place);
    else if ([...text].every(isGap))
      issues.error('row-without-residues', `Row ${shown(name)} holds gaps alone. Leave it out.`, place);
  }
}

/** Reports a file whose letters are bases: `rows-are-dna`. */
export function checkProtein(records: readonly FastaRecord[], issues: IssueList): void {
  let letters = 0;
  let bases = 0;
  for (const { text } of records) {
    const residues = text.replace(/[^A-Za-z]/g, '');
    letters += residues.length;
    bases += residues.replace(/[^ACGTUNacgtun]/g, '').length;
  }
  if (letters < MIN_LETTERS_FOR_DNA || bases < letters * DNA_FRACTION) return;
  issues.error(
    'rows-are-dna',
    'These rows are DNA or RNA; an alignment of proteins is needed here. Translate them and align the proteins, or paste coding DNA as a construct under Plan.',
    { line: records[0]?.line ?? 1, column: 1 },
  );
}
