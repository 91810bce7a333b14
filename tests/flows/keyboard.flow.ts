// Steps 2 to 8 by the keyboard alone.
import { readFile } from 'node:fs/promises';
import { codingRecord } from '@/tests/support/stage';
import { primerCaution } from './support/expected';
import { Keys } from './support/keys';
import { openFlowStage, type FlowStage } from './support/stage';
import { phone, Visitor, wide } from './support/visitor';
import { button, field, fixture, gone, link, makeProject, see, signUp } from './support/walk';
import { withPage } from './support/with-page';

let stage: FlowStage;
beforeAll(async () => {
  stage = await openFlowStage();
});
afterAll(() => stage?.close());

describe.each([wide, phone])('without a mouse on a $name screen', (size) => {
  const isPhone = size.name === 'phone';
  let visitor: Visitor;
  let keys: Keys;
  beforeAll(async () => {
    visitor = await Visitor.at(stage.browser, stage.server.origin, size);
    keys = new Keys(visitor.page);
    await signUp(visitor, 'Di Keys');
    await makeProject(visitor.page, `Keys on a ${size.name}`);
  });
  afterAll(() => visitor?.close());
  const walk = (act: Parameters<typeof withPage>[1]) => withPage(() => visitor, act);
  const place = (name: string) => link(visitor.page.getByRole('navigation', { name: 'Places' }), name);

  /** `/`, an address, and its first reading. */
  const goTo = async (address: string) => {
    await keys.press('/');
    const box = visitor.page.getByRole('combobox', { name: 'Find a residue' });
    await keys.to(box);
    await keys.write(address);
    await see(visitor.page.getByRole('status').filter({ hasText: `of ${address}` }));
    await keys.press('ArrowDown');
    await keys.press('Enter');
    await visitor.page.waitForURL(/\/residues\//);
  };

  test(
    'an alignment is uploaded',
    walk(async (page) => {
      await keys.enter(link(page, isPhone ? 'Upload a file' : 'Upload an alignment'));
      await keys.choose(field(page, 'Family'), /^c ·/);
      await keys.chooseFile(button(page, 'Choose a file'), fixture('alignments/c_small_mafft.afa'));
      await see(page.getByText('Stored. c_small_mafft.afa was read whole.'));
    }),
  );

  test(
    'coordinates are uploaded and their map is confirmed',
    walk(async (page) => {
      await keys.enter(place('Find'));
      await keys.enter(link(page, 'Upload coordinates'));
      await keys.chooseFile(button(page, 'Choose a file'), fixture('structures/4bem.pdb'));
      const way = link(page, 'Confirm the map');
      const confirm = button(page, 'Confirm the 10 that are ready');
      await see(way.or(confirm));
      if (await way.isVisible()) await keys.enter(way);
      await keys.enter(confirm);
      await see(page.getByText('10 decided'));
    }),
  );

  test(
    'a residue is found, and its neighbours with [ and ]',
    walk(async (page) => {
      await goTo('cE62');
      const at = (number: number) =>
        page.getByRole('heading', { level: 1, name: new RegExp(` ${number}, sequence numbering, ATPE2`) });
      await see(at(62));
      await keys.press(']');
      await see(at(63));
      await keys.press('[');
      await see(at(62));
      if (isPhone) return;
      await keys.to(page.getByRole('tab', { name: 'Column' }));
      await keys.press('ArrowRight');
      await see(page.getByRole('table', { name: 'Copies of this residue' }));
    }),
  );

  test(
    'a numbering is set',
    walk(async (page) => {
      await keys.enter(place('Find'));
      await keys.enter(link(page.getByRole('list', { name: 'Families' }), /^family c, /));
      await keys.enter(link(page, 'ATPE1_ACEWO_4BEM'));
      await keys.fill(field(page, 'Name'), 'hairpin');
      await keys.fill(field(page, 'Number 1 is this residue of the sequence'), '18');
      await keys.enter(button(page, 'Save the numbering'));
      await see(page.getByText('Saved. Every screen shows hairpin numbers where it is preferred.'));
    }),
  );

  test(
    'a pin is set with p, edited, accepted, contested and retired',
    walk(async (page) => {
      await goTo('A:62');
      await see(page.getByRole('region', { name: 'Pins' }));
      await keys.press('p');
      const form = page.getByRole('dialog', { name: 'Pin here' });
      await keys.choose(field(form, 'Kind'), /^ion site$/);
      await keys.fill(field(form, 'What is known'), 'Takes the ion.');
      await keys.enter(button(form, 'Add evidence'));
      await keys.choose(field(form, 'Kind of evidence 1'), /^publication$/);
      await keys.fill(field(form, 'Where evidence 1 is found'), 'entry 4bem');
      const confidence = form.getByRole('radiogroup', { name: 'Confidence' });
      await keys.to(confidence.getByRole('radio', { checked: true }));
      await keys.press('ArrowRight');
      const sure = await confidence.getByRole('radio', { checked: true }).innerText();
      await keys.enter(button(form, 'Pin'));
      await gone(form);
      const pins = page.getByRole('region', { name: 'Pins' });
      await see(
        pins.getByRole('article', { name: 'ion site, proposed' }),
        pins.getByText(`confidence ${sure}`),
      );

      await keys.enter(button(pins, /^Accept: /));
      await see(pins.getByRole('article', { name: 'ion site, accepted' }));
      await keys.enter(button(pins, /^What can be done with: /));
      await keys.enter(button(pins, /^Edit: /));
      const edit = page.getByRole('dialog', { name: 'Edit this pin' });
      await keys.fill(field(edit, 'What is known'), 'Takes the ion on each turn.');
      await keys.enter(button(edit, 'Save'));
      await gone(edit);
      for (const [act, status] of [
        ['Contest', 'contested'],
        ['Retire', 'retired'],
      ]) {
        await keys.enter(button(pins, new RegExp(`^${act}: `)));
        const asks = page.getByRole('dialog', { name: `${act} this pin?` });
        await keys.fill(field(asks, 'Reason'), 'Tried by the keys.');
        await keys.enter(button(asks, act ?? ''));
        await gone(asks);
        if (status === 'retired') await keys.enter(button(pins, 'Show 1 retired'));
        await see(pins.getByRole('article', { name: `ion site, ${status}` }));
      }
    }),
  );

  test(
    'a message is written with r',
    walk(async (page) => {
      await keys.press('r');
      const composer = page.getByRole('textbox', { name: /^Message about / });
      await keys.to(composer);
      await keys.write('Said by the keys.');
      await keys.press('ControlOrMeta+Enter');
      await see(page.getByRole('log').getByRole('article').filter({ hasText: 'Said by the keys.' }));
    }),
  );

  test(
    'a construct is added, a change planned, its design chosen and the primers exported',
    walk(async (page) => {
      await keys.enter(place('Plan'));
      await keys.enter(link(page, 'Add a construct'));
      await keys.fill(field(page, 'Name'), 'pVc');
      await keys.choose(field(page, 'Family'), /^c,/);
      await keys.choose(field(page, 'Protein'), /^ATPE_VIBCH/);
      await keys.fill(field(page, 'DNA'), codingRecord('VIBCH_atpE'));
      await keys.enter(button(page, 'Add the construct'));
      await see(page.getByRole('heading', { level: 1, name: 'pVc' }));
      await keys.enter(link(page, 'Plan a mutation'));
      await keys.fill(field(page, 'Change'), 'D60Q');
      await see(page.getByText('the protein has it there'));
      await keys.choose(field(page, 'Construct'), /^pVc/);
      await keys.enter(button(page, 'Plan and design primers'));
      await see(page.getByRole('heading', { level: 1, name: /^Mutant D60Q/ }));
      await keys.enter(button(page, 'Choose design 1'));
      await see(page.getByText('chosen', { exact: true }));
      await keys.enter(place('Plan'));
      await see(page.getByText(primerCaution));
      await keys.to(button(page, 'Export primers'));
      const [download] = await Promise.all([page.waitForEvent('download'), keys.press('Enter')]);
      const list = await readFile(await download.path(), 'utf8');
      expect(list).toContain(primerCaution);
      expect(list.match(/^D60Q_[FR],/gm)).toHaveLength(2);
    }),
  );
});
