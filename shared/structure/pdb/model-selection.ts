import type { IssueList } from '../issue-list';
import { type Columns, type LineSpan } from './columns';

/**
 * Which atom lines belong to the model to be read. Models are the groups between MODEL and ENDMDL, and atoms outside
 * of any such pair; without a wanted number, the first that holds an atom.
 */
export class ModelSelection {
  count = 0;
  chosenNumber = 1;
  /** The model being read is the chosen one. */
  isOpen = false;
  private inModel = false;
  private currentNumber = 0;
  private readonly numbers: number[] = [];

  constructor(
    private readonly columns: Columns,
    private readonly wanted: number | undefined,
    private readonly issues: IssueList,
  ) {}

  /** MODEL. `atoms` is how many have been read so far. */
  begin(line: LineSpan, atoms: number): void {
    const field = this.columns.text(line, 7, 20).trim();
    const stated = /^\d{1,9}$/.test(field) ? Number(field) : null;
    if (stated === null && field !== '') {
      this.issues.warn('bad-model-number', `"${field}" is no model number.`, {
        line: line.number,
        column: 11,
      });
    }
    this.open(stated ?? this.currentNumber + 1, atoms);
  }

  /** ENDMDL. */
  end(): void {
    this.inModel = false;
    this.isOpen = false;
  }

  /** Whether an atom line is of the chosen model; one outside of any model begins its own. */
  takesAtom(line: LineSpan, atoms: number): boolean {
    if (!this.inModel) {
      if (this.count > 0) {
        this.issues.warn(
          'atoms-outside-models',
          'These atoms stand outside of MODEL and ENDMDL: read as a model.',
          {
            line: line.number,
          },
        );
      }
      this.open(this.currentNumber + 1, atoms);
    }
    return this.isOpen;
  }

  /** Tells with an error, and false, when there is nothing to put together. */
  finish(atoms: number): boolean {
    if (atoms > 0) return true;
    if (this.wanted !== undefined && this.count > 0 && !this.numbers.includes(this.wanted)) {
      const listed = this.numbers.slice(0, 20).join(', ');
      const text = `There is no model ${this.wanted}; the file holds ${this.count}: ${listed}.`;
      this.issues.error('model-not-found', text);
    } else
      this.issues.error(
        'no-atoms',
        'The file holds no atom that can be read. Choose the file with the ATOM lines.',
      );
    return false;
  }

  private open(number: number, atoms: number): void {
    this.inModel = true;
    this.count++;
    this.currentNumber = number;
    this.numbers.push(number);
    this.isOpen = this.wanted === undefined ? atoms === 0 : number === this.wanted && atoms === 0;
    if (this.isOpen) this.chosenNumber = number;
  }
}
