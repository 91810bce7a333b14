import { z } from 'zod';
import { storage, type Storage } from './storage';

const storedDraft = z.object({
  text: z.string(),
  /** Counts the writes: whoever writes on an older one is told instead of overwriting. */
  sequence: z.int(),
  /** The message it was before nobody took it for a day: sent unchanged, it keeps its key. */
  returned: z.object({ clientKey: z.string(), text: z.string() }).optional(),
});
export type Draft = z.infer<typeof storedDraft>;
export type DraftWrite = { kept: true; sequence: number } | { kept: false; there: Draft };

export const noDraft: Draft = { text: '', sequence: 0 };

/** What somebody types, by account and place. It outlives reload, sign-out and other tabs. */
export class Drafts {
  constructor(private readonly storage: Storage) {}

  async read(account: string, place: string): Promise<Draft> {
    return parse(await this.storage.get(keyOf(account, place)));
  }

  /** Writes when nobody else wrote since `basedOn`; else nothing is written. */
  async write(account: string, place: string, text: string, basedOn: number): Promise<DraftWrite> {
    let outcome: DraftWrite = { kept: false, there: noDraft };
    await this.storage.update(keyOf(account, place), (stored) => {
      const there = parse(stored);
      if (there.sequence !== basedOn && there.text !== text && there.text !== '') {
        outcome = { kept: false, there };
        return there;
      }
      const sequence = Math.max(there.sequence, basedOn) + 1;
      outcome = { kept: true, sequence };
      return { ...there, text, sequence };
    });
    return outcome;
  }

  /** Texts that other tabs wrote at the same place at the same time, oldest first. */
  async beside(account: string, place: string): Promise<{ place: string; text: string }[]> {
    const keys = (await this.storage.keysFrom(keyOf(account, `${place}~`))).sort();
    const places = keys.map((key) => key.slice(keyOf(account, '').length));
    const found = await Promise.all(
      places.map(async (one) => ({ place: one, text: (await this.read(account, one)).text })),
    );
    return found.filter(({ text }) => text !== '');
  }

  /** It was sent or thrown away. The sequence goes on, so that a tab left behind writes beside, not over. */
  async clear(account: string, place: string): Promise<number> {
    let sequence = 0;
    await this.storage.update(keyOf(account, place), (stored) => {
      sequence = parse(stored).sequence + 1;
      return { text: '', sequence };
    });
    if (place.includes('~')) await this.storage.remove(keyOf(account, place));
    return sequence;
  }

  /** A message that nobody took for a day: behind what is typed there already. */
  async giveBack(
    account: string,
    place: string,
    message: { clientKey: string; text: string },
  ): Promise<void> {
    await this.storage.update(keyOf(account, place), (stored) => {
      const there = parse(stored);
      if (there.returned?.clientKey === message.clientKey) return there;
      const text = there.text ? `${there.text}\n\n${message.text}` : message.text;
      return { text, sequence: there.sequence + 1, returned: message };
    });
  }
}

function keyOf(account: string, place: string): string {
  return `draft/${account}/${place}`;
}

function parse(stored: unknown): Draft {
  const parsed = storedDraft.safeParse(stored);
  return parsed.success ? parsed.data : noDraft;
}

export const drafts = new Drafts(storage);
