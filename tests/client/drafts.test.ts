import { DraftSession } from '@/client/draft-session';
import { Drafts } from '@/client/drafts';
import { memoryStorage } from '@/client/storage';

const place = 'thread:p/residue:a:58';
const drafts = () => new Drafts(memoryStorage());

beforeEach(() => jest.useFakeTimers());
afterEach(() => jest.useRealTimers());

test('what is typed is kept within a second, and is there after a reload', async () => {
  const kept = drafts();
  const editor = new DraftSession(kept, 'ines', place);
  await editor.open();
  editor.type('H');
  editor.type('H+ path');
  await jest.advanceTimersByTimeAsync(1000);
  const again = new DraftSession(kept, 'ines', place);
  await again.open();
  expect(again.read().text).toBe('H+ path');
});

test('a draft does not leak to the next account on the same browser', async () => {
  const kept = drafts();
  await kept.write('ines', place, 'mine', 0);
  expect(await kept.read('omar', place)).toEqual({ text: '', sequence: 0 });
});

test('two tabs at one place lose neither text', async () => {
  const kept = drafts();
  const one = new DraftSession(kept, 'ines', place);
  const two = new DraftSession(kept, 'ines', place);
  await Promise.all([one.open(), two.open()]);
  one.type('from the first tab');
  await one.flush();
  two.type('from the second tab');
  await two.flush();
  expect(two.read()).toMatchObject({
    text: 'from the second tab',
    elsewhere: { text: 'from the first tab' },
  });
  two.type('from the second tab, longer');
  await two.flush();
  one.type('from the first tab, longer');
  await one.flush();
  const later = new DraftSession(kept, 'ines', place);
  await later.open();
  expect(later.read()).toMatchObject({
    text: 'from the first tab, longer',
    elsewhere: { text: 'from the second tab, longer' },
  });
  later.takeElsewhere();
  await later.flush();
  const last = new DraftSession(kept, 'ines', place);
  await last.open();
  expect(last.read()).toMatchObject({
    text: 'from the first tab, longer\n\nfrom the second tab, longer',
    elsewhere: null,
  });
});

test('after sending the place is empty, also when something was about to be written', async () => {
  const kept = drafts();
  const editor = new DraftSession(kept, 'ines', place);
  await editor.open();
  editor.type('sent');
  await editor.clear();
  await jest.advanceTimersByTimeAsync(1000);
  expect((await kept.read('ines', place)).text).toBe('');
  editor.type('next');
  await editor.flush();
  expect((await kept.read('ines', place)).text).toBe('next');
});

test('a message given back stands behind what is typed there, once, with the key it had', async () => {
  const kept = drafts();
  await kept.write('ines', place, 'new thought', 0);
  const message = { clientKey: 'k', text: 'old one' };
  await kept.giveBack('ines', place, message);
  await kept.giveBack('ines', place, message);
  expect(await kept.read('ines', place)).toMatchObject({ text: 'new thought\n\nold one', returned: message });
});

test('somebody who types before the draft was read keeps both', async () => {
  const kept = drafts();
  await kept.write('ines', place, 'from before', 0);
  const editor = new DraftSession(kept, 'ines', place);
  const opening = editor.open();
  editor.type('typed at once');
  await opening;
  expect(editor.read()).toMatchObject({ text: 'typed at once', elsewhere: { text: 'from before' } });
  await editor.flush();
});
