import { baseIndex, type BaseIndex } from '../positions';
import { hasErrors, type Issue, type ParseResult } from '../parse-result';
import { IUPAC_BASES, readBases, wrap, type Strand } from './bases';
import { isStartCodon, translate, type GeneticCodeId } from './genetic-code';

export interface CodingRequest {
  /** The whole construct, upper case. */
  bases: string;
  circular: boolean;
  /** First base of the first codon, from 1, counted on the strand as given. */
  start: number;
  /** Last base of the coding part, stop codon included, from 1; left out: the first stop in frame. */
  end?: number;
  table: GeneticCodeId;
  /** The strand that reads as the protein; `-` counts down from `start`. */
  strand?: Strand;
}

/** The coding part of a construct and the protein it encodes. Plain JSON. */
export interface Coding {
  strand: Strand;
  table: GeneticCodeId;
  circular: boolean;
  /** Index of the first base of the first codon, from 0, on the strand as given. */
  start: BaseIndex;
  /** Bases in whole codons, the final stop included when there is one. */
  length: number;
  hasStop: boolean;
  /** What is made: without the final stop, a start codon of the table at the start as M. */
  protein: string;
  /** Each codon with its normal meaning, the final stop as `*`. */
  literal: string;
  /** For each residue of `protein` the index of its codon's first base (in reading direction), from 0, on the strand as given. */
  codonStarts: BaseIndex[];
}

/** Fewer codons than this before the first stop: probably not the frame that was meant (choice, no source). */
export const SHORT_FRAME_CODONS = 30;

const problem = (severity: Issue['severity'], code: string, message: string, residue?: string): Issue => ({
  code,
  severity,
  message,
  ...(residue ? { residue } : {}),
});

/** Index of the first base of a codon, counted from 0 in the coding part, on the strand as given. */
function codonPlace(start: number, codon: number, strand: Strand, size: number): BaseIndex {
  return baseIndex(wrap(strand === '+' ? start + 3 * codon : start - 3 * codon, size));
}

function placeIssues(request: CodingRequest): Issue[] {
  const { bases, circular, start, end, strand = '+' } = request;
  const outside = (place: number) => !Number.isInteger(place) || place < 1 || place > bases.length;
  const span = `the construct has bases 1 to ${bases.length}`;
  if (bases.length === 0) return [problem('error', 'empty', 'There is no DNA.')];
  if ([...new Set(bases)].some((letter) => !(letter in IUPAC_BASES)))
    return [problem('error', 'unknown-base', 'The DNA holds characters that are no bases.')];
  if (outside(start))
    return [problem('error', 'start-outside', `The coding part cannot start at ${start}: ${span}.`)];
  if (end === undefined) return [];
  if (outside(end))
    return [problem('error', 'end-outside', `The coding part cannot end at ${end}: ${span}.`)];
  if (circular || (strand === '+' ? end >= start : end <= start)) return [];
  const advice =
    strand === '+'
      ? 'mark the construct as circular, or the coding part as on the reverse strand'
      : 'on the reverse strand the end has the lower number';
  return [
    problem('error', 'end-before-start', `The end (${end}) lies before the start (${start}); ${advice}.`),
  ];
}

/** Bases from the start to the end that is given, or to the end of the DNA (once round a circle). */
function availableLength({ bases, circular, start, end, strand = '+' }: CodingRequest): number {
  const size = bases.length;
  if (end !== undefined) return wrap(strand === '+' ? end - start : start - end, size) + 1;
  if (circular) return size;
  return strand === '+' ? size - start + 1 : start;
}

function frameIssues(request: CodingRequest, available: number): Issue[] {
  const rest = available % 3;
  if (request.end === undefined || rest === 0) return [];
  const tail = readBases(request.bases, request.start - 1, available, request.strand ?? '+').slice(-rest);
  // Stops of vertebrate mitochondrial genes may be completed by the poly(A) tail.
  if (request.table === 2 && (tail === 'T' || tail === 'TA'))
    return [
      problem(
        'warning',
        'stop-completed-by-tail',
        `The last ${rest === 1 ? 'base' : 'bases'} ${tail} would become a stop with the poly(A) tail.`,
      ),
    ];
  return [
    problem(
      'error',
      'not-in-frame',
      `From ${request.start} to ${request.end} are ${available} bases, ${rest} more than ${(available - rest) / 3} whole codons; move the start or the end.`,
    ),
  ];
}

/**
 * Finds the coding part of a construct and the protein it encodes. Places that people type count from 1, inclusive; indices in the
 * answer from 0. A circular construct may be read across its origin, either strand may be read.
 *
 * Errors: `empty`, `unknown-base`, `start-outside`, `end-outside`, `end-before-start`, `not-in-frame`, `inner-stop`, `no-codons`.
 * Warnings: `no-start-codon`, `start-read-as-methionine`, `no-final-stop`, `short-frame`, `ambiguous-codons`,
 * `stop-completed-by-tail`.
 */
export function readCoding(request: CodingRequest): ParseResult<Coding> {
  const { bases, circular, table, strand = '+' } = request;
  const issues = placeIssues(request);
  if (hasErrors(issues)) return { value: null, issues };
  const available = availableLength(request);
  issues.push(...frameIssues(request, available));
  const start = request.start - 1;
  const sense = readBases(bases, start, available - (available % 3), strand);
  let literal = translate(sense, table);
  const stop = literal.indexOf('*');
  if (request.end === undefined && stop >= 0) literal = literal.slice(0, stop + 1);
  const hasStop = literal.endsWith('*');
  const made = hasStop ? literal.slice(0, -1) : literal;
  const at = (codon: number) => codonPlace(start, codon, strand, bases.length) + 1;
  const inner = made.indexOf('*');
  if (inner >= 0)
    issues.push(
      problem(
        'error',
        'inner-stop',
        `The stop ${sense.slice(3 * inner, 3 * inner + 3)} at base ${at(inner)} (codon ${inner + 1}) lies inside the coding part.`,
        String(inner + 1),
      ),
    );
  if (made.length === 0)
    issues.push(
      problem(
        'error',
        'no-codons',
        `There is no codon to read at base ${request.start} before a stop or the end.`,
      ),
    );
  if (hasErrors(issues)) return { value: null, issues };

  const first = sense.slice(0, 3);
  const isStart = isStartCodon(first, table);
  if (!isStart)
    issues.push(
      problem(
        'warning',
        'no-start-codon',
        `The first codon ${first} at base ${request.start} is no start codon of table ${table}.`,
        '1',
      ),
    );
  else if (first !== 'ATG')
    issues.push(problem('warning', 'start-read-as-methionine', `${first} at the start is read as Met.`, '1'));
  if (!hasStop)
    issues.push(
      problem('warning', 'no-final-stop', `The coding part ends at codon ${made.length} without a stop.`),
    );
  else if (request.end === undefined && made.length < SHORT_FRAME_CODONS)
    issues.push(
      problem(
        'warning',
        'short-frame',
        `The first stop in frame comes at base ${at(made.length)}, after only ${made.length} codons; is the start right?`,
      ),
    );
  const unclear = [...made].flatMap((letter, codon) => (letter === 'X' ? [codon + 1] : []));
  if (unclear.length > 0)
    issues.push(
      problem(
        'warning',
        'ambiguous-codons',
        `${unclear.length} codons are not settled and read as X (first: codon ${unclear[0]}).`,
        String(unclear[0]),
      ),
    );
  return {
    value: {
      strand,
      table,
      circular,
      start: baseIndex(start),
      length: literal.length * 3,
      hasStop,
      protein: isStart ? `M${made.slice(1)}` : made,
      literal,
      codonStarts: Array.from(made, (_, codon) => codonPlace(start, codon, strand, bases.length)),
    },
    issues,
  };
}
