import type { ChainMap } from '@/shared/contracts/maps';

type MapException = ChainMap['exceptions'][number];

/** One exception, or a run of neighbours outside the protein, which are read as one. */
export interface ExceptionRun extends MapException {
  /** `61`, or `1 to 12`. */
  labels: string;
  /** `Q`, or `MHHHHHH`. */
  letters: string;
}

const mostLetters = 20;

function goesOn(run: ExceptionRun, lastLabel: string, next: MapException): boolean {
  const isPlain = /^-?\d+$/.test(lastLabel) && /^-?\d+$/.test(next.label);
  return (
    run.kind === next.kind &&
    run.residueIndex === null &&
    next.residueIndex === null &&
    isPlain &&
    Number(next.label) === Number(lastLabel) + 1
  );
}

/** Joins residues without a partner that follow one another in the chain; the order is kept. */
export function exceptionRuns(exceptions: readonly MapException[]): ExceptionRun[] {
  const runs: { run: ExceptionRun; last: string }[] = [];
  for (const exception of exceptions) {
    const open = runs.at(-1);
    if (open && goesOn(open.run, open.last, exception)) {
      open.last = exception.label;
      open.run.labels = `${open.run.label} to ${exception.label}`;
      open.run.letters += exception.chainLetter;
    } else {
      const { label, chainLetter } = exception;
      runs.push({ run: { ...exception, labels: label, letters: chainLetter }, last: label });
    }
  }
  return runs.map(({ run }) => ({ ...run, letters: shortened(run.letters) }));
}

const shortened = (letters: string): string =>
  letters.length <= mostLetters
    ? letters
    : `${letters.slice(0, mostLetters)} and ${letters.length - mostLetters} more`;
