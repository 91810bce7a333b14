import type { Draft } from '../draft';
import type { IssueList } from '../issue-list';
import type { StructureLimits } from '../limits';
import { AtomRecords } from './atom-records';
import { Columns, packedText, type LineSpan } from './columns';
import { HeaderRecords } from './header-records';
import { eachLine } from './lines';
import { ModelSelection } from './model-selection';

const ATOM = packedText('ATOM');
const HETA = packedText('HETA');
const TER = packedText('TER');
const MODE = packedText('MODE');
const ENDM = packedText('ENDM');
const END = packedText('END');
const REMA = packedText('REMA');
const MISSING_RESIDUES = packedText(' 465');
const HEADERS = new Set(['TITL', 'SEQR', 'MODR', 'DBRE', 'SEQA'].map(packedText));

/** One pass over the lines of a file, record by record. */
export class PdbFile {
  private readonly columns: Columns;
  private readonly atoms: AtomRecords;
  private readonly header: HeaderRecords;
  private readonly models: ModelSelection;
  private lastLine = 0;
  private endLine = 0;
  private failed = false;

  constructor(
    bytes: Uint8Array,
    wantedModel: number | undefined,
    private readonly limits: StructureLimits,
    private readonly issues: IssueList,
  ) {
    const columns = new Columns(bytes);
    this.columns = columns;
    this.atoms = new AtomRecords(columns, issues);
    this.header = new HeaderRecords(columns, issues);
    this.models = new ModelSelection(columns, wantedModel, issues);
  }

  /** Null, with an error told, when the file cannot be used. */
  read(): Draft | null {
    eachLine(this.columns.bytes, (line) => this.readLine(line));
    if (this.failed) return null;
    const { table, registry } = this.atoms;
    const declarations = this.header.finish();
    if (!this.models.finish(table.count)) return null;
    if (this.endLine === 0) {
      this.issues.warn('no-end', 'The file does not close with END: it may have been cut off.', {
        line: this.lastLine,
      });
    }
    return {
      format: 'pdb',
      modelCount: this.models.count,
      modelNumber: this.models.chosenNumber,
      chains: registry.chains,
      residues: registry.residues,
      atoms: table,
      declarations,
    };
  }

  /** False to stop. */
  private readLine(line: LineSpan): boolean {
    this.lastLine = line.number;
    const record = this.recordCode(line);
    if (this.endLine > 0) return this.readAfterEnd(line, record);
    if (record === ATOM || record === HETA) return this.readAtom(line, record === HETA);
    if (record === TER) {
      if (this.models.isOpen) this.atoms.end(line);
    } else if (record === MODE) {
      this.models.begin(line, this.atoms.table.count);
      return this.models.count <= this.limits.models || this.fail('models', this.limits.models, line);
    } else if (record === ENDM) this.models.end();
    else if (record === END) this.endLine = line.number;
    else if (HEADERS.has(record) || this.isMissingResidue(line, record)) {
      this.header.read(line);
      if (this.header.entries > this.limits.headerEntries) {
        return this.fail('header-rows', this.limits.headerEntries, line);
      }
    }
    return true;
  }

  private readAtom(line: LineSpan, hetero: boolean): boolean {
    if (!this.models.takesAtom(line, this.atoms.table.count)) return true;
    this.atoms.read(line, hetero);
    const { table, registry } = this.atoms;
    if (table.count > this.limits.atoms) return this.fail('atoms', this.limits.atoms, line);
    if (registry.chains.length > this.limits.chains) return this.fail('chains', this.limits.chains, line);
    return this.models.count <= this.limits.models || this.fail('models', this.limits.models, line);
  }

  private isMissingResidue(line: LineSpan, record: number): boolean {
    return (
      record === REMA && line.end - line.start >= 10 && this.columns.four(line.start + 6) === MISSING_RESIDUES
    );
  }

  /** The first four columns, blank where the line ends before them. */
  private recordCode(line: LineSpan): number {
    if (line.end - line.start >= 4) return this.columns.four(line.start);
    return packedText(this.columns.text(line, 1, 4));
  }

  private readAfterEnd(line: LineSpan, record: number): boolean {
    if (record !== ATOM && record !== HETA) return true;
    this.issues.warn('after-end', 'Atoms follow the END of the file; they are not read.', {
      line: line.number,
    });
    return false;
  }

  private fail(what: string, limit: number, line: LineSpan): false {
    this.failed = true;
    this.issues.error(`too-many-${what}`, `The file holds more than ${limit} ${what.replace('-', ' ')}.`, {
      line: line.number,
    });
    return false;
  }
}
