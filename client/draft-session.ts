import { noDraft, type Draft, type Drafts } from './drafts';
import { Emitter } from './emitter';
import { newId } from './new-id';

export interface DraftView {
  /** Null until it was read. */
  text: string | null;
  /** What another tab typed at the same place meanwhile; both are kept. */
  elsewhere: { place: string; text: string } | null;
  returned: Draft['returned'];
}

const writeWithinMilliseconds = 500;

/** One open editor: shows the draft of its place and writes what is typed, within half a second. */
export class DraftSession {
  private view: DraftView = { text: null, elsewhere: null, returned: undefined };
  private sequence = 0;
  private writesAt: string;
  private timer: ReturnType<typeof setTimeout> | null = null;
  private writing: Promise<unknown> = Promise.resolve();
  private readonly changes = new Emitter<[]>();
  readonly subscribe = this.changes.subscribe;
  readonly read = (): DraftView => this.view;

  constructor(
    private readonly drafts: Drafts,
    private readonly account: string,
    place: string,
  ) {
    this.writesAt = place;
  }

  async open(): Promise<void> {
    const place = this.writesAt;
    const draft = await this.drafts.read(this.account, place).catch(() => noDraft);
    const [beside] = await this.drafts.beside(this.account, place).catch(() => []);
    this.sequence = draft.sequence;
    // Somebody who typed before it was read goes on with what they typed.
    if (this.view.text === null)
      this.show({ text: draft.text, returned: draft.returned, elsewhere: beside ?? null });
    else if (draft.text && draft.text !== this.view.text)
      this.show({ elsewhere: { place, text: draft.text } });
  }

  type(text: string): void {
    this.show({ text });
    this.timer ??= setTimeout(() => void this.flush(), writeWithinMilliseconds);
  }

  /** Writes now: the page may be going away. */
  flush(): Promise<unknown> {
    if (this.timer === null) return this.writing;
    clearTimeout(this.timer);
    this.timer = null;
    return this.next(() => this.write());
  }

  /** The text was sent or thrown away. */
  clear(): Promise<unknown> {
    if (this.timer !== null) clearTimeout(this.timer);
    this.timer = null;
    this.show({ text: '', returned: undefined });
    return this.next(async () => {
      this.sequence = await this.drafts.clear(this.account, this.writesAt);
    });
  }

  /** Puts what another tab typed behind what stands here. */
  takeElsewhere(): void {
    const { elsewhere, text } = this.view;
    if (!elsewhere) return;
    this.type(text ? `${text}\n\n${elsewhere.text}` : elsewhere.text);
    this.show({ elsewhere: null });
    if (elsewhere.place !== this.writesAt)
      void this.next(() => this.drafts.clear(this.account, elsewhere.place));
  }

  private async write(): Promise<void> {
    const text = this.view.text ?? '';
    const wrote = await this.drafts.write(this.account, this.writesAt, text, this.sequence);
    if (wrote.kept) {
      this.sequence = wrote.sequence;
      return;
    }
    // Another tab was first: this one goes on beside it.
    this.show({ elsewhere: { place: this.writesAt, text: wrote.there.text } });
    this.writesAt = `${this.writesAt.split('~')[0] ?? ''}~${newId()}`;
    const beside = await this.drafts.write(this.account, this.writesAt, text, 0);
    if (beside.kept) this.sequence = beside.sequence;
  }

  private next(work: () => Promise<unknown>): Promise<unknown> {
    this.writing = this.writing.then(work).catch((error: unknown) => console.error(error));
    return this.writing;
  }

  private show(change: Partial<DraftView>): void {
    this.view = { ...this.view, ...change };
    this.changes.emit();
  }
}
