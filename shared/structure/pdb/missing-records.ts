import type { MissingResidue } from '../draft';
import { type Columns, type LineSpan } from './columns';
import { decodeHybrid36 } from './hybrid-36';

/** REMARK 465: declared residues without coordinates, with the models that lack them where the file tells. */
export class MissingRecords {
  readonly byChain = new Map<string, MissingResidue[]>();
  private inTable = false;
  private models: MissingResidue['models'];

  constructor(private readonly columns: Columns) {}

  /** Reads a line of REMARK 465; true when it was a row of the table. */
  read(line: LineSpan): boolean {
    if (!this.inTable) {
      this.readHeading(this.columns.text(line, 11, 80));
      return false;
    }
    const name = this.columns.text(line, 16, 18).trim();
    const authorNumber = decodeHybrid36(this.columns.text(line, 22, 26), 5);
    if (name === '' || authorNumber === null) {
      this.readHeading(this.columns.text(line, 11, 80));
      return false;
    }
    const chain = this.columns.text(line, 20, 20);
    const model = decodeHybrid36(this.columns.text(line, 12, 14), 3);
    const rows = this.byChain.get(chain) ?? [];
    this.byChain.set(chain, rows);
    rows.push({
      name,
      authorNumber,
      insertionCode: this.columns.text(line, 27, 27).trim(),
      models: model === null ? this.models : { first: model, last: model },
    });
    return true;
  }

  /** `M RES C SSSEQI` begins the rows; `MODELS 1-10` above it says which models they hold for. */
  private readHeading(text: string): void {
    const range = /MODELS?\s+(\d{1,6})(?:\s*-\s*(\d{1,6}))?/.exec(text);
    if (range) this.models = { first: Number(range[1]), last: Number(range[2] ?? range[1]) };
    if (/RES\s+C\s+SSSEQI/.test(text)) this.inTable = true;
  }
}
