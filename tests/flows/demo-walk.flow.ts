// Steps 4 to 8 on the demo, by role: what each may do is there, and what they may not is not.
import { readFile } from 'node:fs/promises';

import { modelOrganism } from '@/shared/scenario/organisms.data';
import { people } from '@/shared/scenario/people.data';
import { addressOf, enterDemo, equivalentsOf } from './support/demo';
import { figuresCaution, primerCaution } from './support/expected';
import { openFlowStage, type FlowStage } from './support/stage';
import { phone, Visitor, wide } from './support/visitor';
import {
  button,
  choose,
  facts,
  field,
  gone,
  link,
  locate,
  see,
  tableRows,
  toPlace,
  writeAddress,
} from './support/walk';
import { withPage } from './support/with-page';

let stage: FlowStage;
beforeAll(async () => {
  stage = await openFlowStage({ demo: true });
});
afterAll(() => stage?.close());

const carboxylate = addressOf('c', 'carboxylate');
const number = carboxylate.replace(/\D/g, '');

describe.each([phone, wide])('the demo on a $name screen', (size) => {
  const isPhone = size.name === 'phone';
  let visitor: Visitor;
  const walk = (act: Parameters<typeof withPage>[1]) => withPage(() => visitor, act);
  beforeAll(async () => {
    visitor = await Visitor.at(stage.browser, stage.server.origin, size);
  });
  /** One browser that several people use, one after the other. */
  const enterAs = async (role: string) => {
    await visitor.context.clearCookies();
    await enterDemo(visitor, people.find((person) => person.role === role)?.name ?? '');
  };
  afterAll(() => visitor?.close());

  describe('a reader', () => {
    beforeAll(() => enterAs('reader'));

    test(
      'finds a residue by each of its spellings',
      walk(async (page) => {
        for (const address of [carboxylate, `c${number}`, `K:${number}`]) {
          await toPlace(page, 'Find');
          const readings = await writeAddress(visitor, address);
          await readings
            .getByRole('option', { name: new RegExp(`^c, glutamate ${number}, .*${modelOrganism}`) })
            .first()
            .click();
          await see(page.getByRole('heading', { level: 1, name: new RegExp(`^c, glutamate ${number}, `) }));
          await page.waitForURL(/\/residues\//);
        }
      }),
    );

    test(
      'reads its passport, its equivalents and its copies as the generator made them',
      walk(async (page) => {
        const passport = await facts(page.getByRole('region', { name: 'Passport' }).locator('dl'));
        expect(Object.values(passport)).toContain(`Glu${number}`);
        if (!isPhone) await page.getByRole('tab', { name: 'Column' }).click();
        else
          await button(page, /^Show \d+ more$/)
            .first()
            .click();
        const rows = await tableRows(page.getByRole('table', { name: /^Rows of Column/ }));
        expect(
          rows.map(([plate, organism]) => [/c [A-Z]\d+/.exec(plate ?? '')?.[0], organism]).sort(),
        ).toEqual(equivalentsOf('c', 'carboxylate').sort());
        if (!isPhone) await page.getByRole('tab', { name: /^Copies/ }).click();
        const copies = await tableRows(page.getByRole('table', { name: 'Copies of this residue' }));
        expect(copies.map(([copy]) => copy)).toEqual([...'KLMNOPQRST'].map((chain) => `${chain}:${number}`));
      }),
    );

    test(
      'sees statements, thread and mutants, and no button that writes',
      walk(async (page) => {
        await see(
          page.getByRole('article', { name: 'ion site, accepted' }),
          page.getByRole('list', { name: 'Mutations' }),
          page.getByText('What should', { exact: false }),
          page.getByText(/You read here\. Writing is for contributors/),
        );
        for (const verb of [/^Pin/, /^Accept/, /^Contest/, /^Retire/, /^Edit/, /^Send/, /^Reply/])
          expect(await button(page, verb).count()).toBe(0);
        expect(await link(page, 'Plan a mutation').count()).toBe(0);
        await toPlace(page, 'Find');
        await see(page.getByText('ring and stator model'));
        expect(await link(page, /^Upload/).count()).toBe(0);
        await toPlace(page, 'Plan');
        await see(button(page, 'Export primers'));
        expect(await link(page, /^(Add a construct|Plan a mutation)$/).count()).toBe(0);
      }),
    );
  });

  describe('a contributor', () => {
    beforeAll(() => enterAs('contributor'));

    test(
      'pins, contests and says why, but does not accept',
      walk(async (page) => {
        await locate(visitor, `c${Number(number) + 1}`, new RegExp(modelOrganism));
        await (isPhone ? button(page, 'Pin here') : button(page, 'Pin')).click();
        const form = page.getByRole('dialog', { name: 'Pin here' });
        await field(form, 'Kind').selectOption('note');
        await field(form, 'What is known').fill(`Beside ${carboxylate}, seen on a ${size.name}.`);
        await button(form, 'Pin').click();
        await gone(form);
        const pin = page.getByRole('article', { name: 'note, proposed', exact: true }).last();
        await see(pin, link(pin, /^c, glutamate/));
        expect(await button(pin, /^Accept/).count()).toBe(0);
        await button(pin, /^What can be done with: /).click();
        await button(pin, /^Retire: /).click();
        const retire = page.getByRole('dialog', { name: 'Retire this pin?' });
        await field(retire, 'Reason').fill('Only tried out.');
        await button(retire, 'Retire').click();
        await gone(retire);
      }),
    );

    test(
      'writes in the thread of the residue',
      walk(async (page) => {
        if (isPhone) await button(page, 'Reply').click();
        const text = `Is this one near ${carboxylate}? Asked on a ${size.name}.`;
        await page.getByRole('textbox', { name: /^Message about / }).fill(text);
        await button(page, 'Send').click();
        const said = page
          .getByRole('log')
          .getByRole('article')
          .filter({ hasText: `Asked on a ${size.name}.` });
        await see(said, link(said, /^c, glutamate/));
        expect(await said.count()).toBe(1);
      }),
    );

    test(
      'plans a change in the demo’s construct and takes the primers along',
      walk(async (page) => {
        await locate(visitor, carboxylate, new RegExp(modelOrganism));
        await link(page, 'Plan a mutation').click();
        const change = `${carboxylate.slice(1)}${isPhone ? 'N' : 'S'}`;
        await see(page.getByText(new RegExp(`^At ${number} stands Glu`)));
        await field(page, 'Change').fill(change);
        await see(page.getByText('the protein has it there'));
        await choose(field(page, 'Construct'), /bases$/);
        await button(page, 'Plan and design primers').click();
        await see(page.getByRole('heading', { level: 1, name: new RegExp(`^Mutant ${change}`) }));
        await see(page.getByText(new RegExp(`${change} and no other change\\.`)));
        await button(page, /^Choose (design )?1/).click();
        await see(page.getByText('chosen', { exact: true }));
        await toPlace(page, 'Plan');
        await see(page.getByText(primerCaution));
        const [download] = await Promise.all([
          page.waitForEvent('download'),
          button(page, 'Export primers').click(),
        ]);
        const list = await readFile(await download.path(), 'utf8');
        expect(list).toContain(`${primerCaution} ${figuresCaution}`);
        expect(list.match(new RegExp(`^${change}_[FR],[ACGT]+,\\d+,`, 'gm'))).toHaveLength(2);
      }),
    );

    test(
      'cannot upload',
      walk(async (page) => {
        await toPlace(page, 'Find');
        await see(page.getByText('ring and stator model'));
        expect(await link(page, /^Upload/).count()).toBe(0);
        await page.goto(`${page.url()}/upload?kind=structure`);
        await see(page.getByText('Uploading is for curators and leads'));
        expect(await button(page, 'Choose a file').count()).toBe(0);
      }),
    );
  });

  describe('a curator', () => {
    beforeAll(() => enterAs('curator'));

    test(
      'may upload, confirm and accept',
      walk(async (page) => {
        await link(page, 'Upload coordinates').click();
        await see(button(page, 'Choose a file'));
        await toPlace(page, 'Find');
        await link(page, /^ring and stator model/).click();
        await see(page.getByRole('heading', { name: 'Decide again' }));
        await locate(visitor, carboxylate, new RegExp(modelOrganism));
        const pin = page.getByRole('article', { name: 'ion site, accepted' });
        await button(pin, /^What can be done with: /).click();
        await see(button(pin, /^Edit: /), button(pin, /^Contest: /), button(pin, /^Retire: /));
      }),
    );

    test(
      'sets a numbering that the passport then names',
      walk(async (page) => {
        const organism = isPhone ? 'Nerivola profunda' : 'Cryorota nivalis';
        await toPlace(page, 'Find');
        await link(page.getByRole('list', { name: 'Families' }), /^family c, /).click();
        await link(page, organism).click();
        await field(page, 'Name').fill('tagged');
        await page.getByRole('radio', { name: 'by offset' }).click();
        await field(page, 'Added to the place in the sequence').fill('20');
        await page.getByRole('checkbox', { name: /^Show this numbering first/ }).uncheck();
        await button(page, 'Save the numbering').click();
        await see(page.getByText(/^Saved\./));
        await field(page, 'Go to residue number, sequence numbering').fill('5');
        await button(page, 'Go').click();
        const passport = await facts(page.getByRole('region', { name: 'Passport' }).locator('dl'));
        expect(passport['tagged']).toMatch(/^[A-Z][a-z]{2}25$/);
      }),
    );

    test(
      'pins, accepts and retires',
      walk(async (page) => {
        await (isPhone ? button(page, 'Pin here') : button(page, 'Pin')).click();
        const form = page.getByRole('dialog', { name: 'Pin here' });
        await field(form, 'What is known').fill('Far from the membrane.');
        await button(form, 'Pin').click();
        await gone(form);
        const pins = page.getByRole('region', { name: 'Pins' });
        await button(pins, 'Accept: note, Far from the membrane.').click();
        await see(pins.getByRole('article', { name: 'note, accepted', exact: true }));
        await button(pins, /^What can be done with: note, Far/).click();
        await button(pins, /^Retire: note, Far/).click();
        const retire = page.getByRole('dialog', { name: 'Retire this pin?' });
        await field(retire, 'Reason').fill('Only tried out.');
        await button(retire, 'Retire').click();
        await see(button(pins, 'Show 1 retired'));
      }),
    );
  });
});
