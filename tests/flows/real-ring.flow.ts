// Steps 1 to 6 on real files: the c ring 4bem.pdb with the rows of c_small_mafft.afa.
import { carboxylateName, proteinsOf } from './support/expected';
import { chainsShown, openChain, uploadStructure } from './support/chains';
import { openFlowStage, type FlowStage } from './support/stage';
import { phone, Visitor, wide } from './support/visitor';
import {
  asFile,
  button,
  choose,
  facts,
  field,
  fixture,
  gone,
  link,
  locate,
  makeProject,
  openResidue,
  see,
  signUp,
  tableRows,
  toPlace,
  uploadAlignment,
  words,
  writeAddress,
} from './support/walk';
import { withPage } from './support/with-page';

let stage: FlowStage;
beforeAll(async () => {
  stage = await openFlowStage();
});
afterAll(() => stage?.close());

describe.each([phone, wide])('the c ring on a $name screen', (size) => {
  const isPhone = size.name === 'phone';
  let visitor: Visitor;
  beforeAll(async () => {
    visitor = await Visitor.at(stage.browser, stage.server.origin, size);
  });
  afterAll(() => visitor?.close());
  const walk = (act: Parameters<typeof withPage>[1]) => withPage(() => visitor, act);

  // Source: families and parts of an F-type motor, handbook 1.
  test(
    'a new project comes with the families of its motor, each with its part',
    walk(async (page) => {
      await signUp(visitor, 'Ada Ring');
      await makeProject(page, `Ring on a ${size.name}`);
      const main = page.getByRole('main');
      for (const [family, part] of [
        ['c', 'rotor'],
        ['γ', 'rotor'],
        ['ε', 'rotor'],
        ['a', 'stator'],
        ['α', 'catalytic head'],
        ['β', 'catalytic head'],
        ['b', 'peripheral stalk'],
        ['δ', 'peripheral stalk'],
      ])
        await see(link(main, `family ${family}, ${part}`));
    }),
  );

  test(
    'a broken file shows all its problems with line and column and stores nothing',
    walk(async (page) => {
      await link(page, isPhone ? 'Upload a file' : 'Upload an alignment').click();
      // The second row is one short, and a sign that is no residue stands in the third.
      const text = '>one\nMEN-LNMD\n>two\nMEN-LNM\n>three\nMEN7LNMD\n';
      await uploadAlignment(page, 'c', asFile('broken.afa', text));
      await see(page.getByText('Not stored. broken.afa has 2 errors.'));
      const errors = page.getByRole('list', { name: 'Errors' });
      const shown = (await errors.getByRole('listitem').allInnerTexts()).map(words);
      expect(shown.map((one) => /^error (\d+:\d+) /.exec(one)?.[1])).toEqual(['3:1', '6:4']);
      await button(errors, /6:4/).click();
      await see(page.getByRole('heading', { name: 'Line 6, column 4' }));
      expect(
        await page.getByRole('region', { name: 'The file around line 6' }).locator('mark').innerText(),
      ).toBe('7');
      await toPlace(page, 'Find');
      await see(
        page.getByText('Refused with 2 errors; nothing was stored.'),
        page.getByText('No alignment yet'),
      );
      await link(page.getByRole('main'), /^family c, rotor .* no proteins$/).click();
      await see(page.getByText('No protein yet'));
    }),
  );

  test(
    'an aligned file makes each row a protein',
    walk(async (page) => {
      await link(page, 'Upload an alignment').click();
      await uploadAlignment(page, 'c', fixture('alignments/c_small_mafft.afa'));
      await see(page.getByText('Stored. c_small_mafft.afa was read whole.'));
      await link(page, isPhone ? 'Family' : 'Open the family').click();
      const rows = await tableRows(page.getByRole('table', { name: 'Proteins of family c' }));
      // Source: residues of each record of the file, as Biopython counts them (expected/alignments).
      expect(rows).toEqual(proteinsOf('c_small_mafft.sto'));
    }),
  );

  test(
    'a structure is read by stages and its chains are matched to two proteins',
    walk(async (page) => {
      await uploadStructure(page, fixture('structures/4bem.pdb'));
      await see(page.getByText('10 protein chains wait for you, or another curator.'));
      // Source: handbook 1: nine chains A to I of one sequence and J of another; both rows come from this entry.
      const shown = await chainsShown(page);
      expect(shown).toEqual([
        expect.stringMatching(
          /A to I .*ATPE2_ACEWO_4BEM.* 100 %.* 100 %.* (no mismatches|0).* c ATPE1_ACEWO_4BEM .*ready$/,
        ),
        expect.stringMatching(
          /\bJ .*ATPE1_ACEWO_4BEM.* 100 %.* 100 %.* (no mismatches|0).* c ATPE2_ACEWO_4BEM .*ready$/,
        ),
      ]);
      await openChain(page, 'J');
      const about = await facts(page.getByRole('region', { name: 'The open chain' }).locator('dl').first());
      // Source: handbook 1 and the entry's SEQRES records: 182 residues, numbered as they stand there.
      expect(about).toMatchObject({
        protein: 'ATPE1_ACEWO_4BEM',
        identity: '100 %',
        'of the chain on the protein': '100 %',
        'places in its sequence': '1 to 182 of 182',
        'residues seen': '182 of 182 declared',
        'author numbers': '1 to 182',
        'runner-up': expect.stringMatching(/^c ATPE2_ACEWO_4BEM \d+\.\d %$/),
      });
    }),
  );

  test(
    'a curator corrects a chain, leaves it out, takes it back and confirms the rest',
    walk(async (page) => {
      const chain = page.getByRole('region', { name: 'The open chain' });
      await chain.getByRole('radio', { name: 'Another protein' }).click();
      await choose(field(chain, 'Family'), /^c/);
      await choose(field(chain, 'Protein'), /^ATPE2_ACEWO_4BEM/);
      await button(chain, 'Map to this protein').click();
      await see(chain.getByText('corrected'));
      expect((await facts(chain.locator('dl').first())).protein).toBe('ATPE2_ACEWO_4BEM');

      await chain.getByRole('radio', { name: 'Leave out' }).click();
      await button(chain, 'Leave J out').click();
      await see(chain.getByText('left out', { exact: true }));

      await chain.getByRole('radio', { name: 'Another protein' }).click();
      await choose(field(chain, 'Protein'), /^ATPE1_ACEWO_4BEM/);
      await button(chain, 'Map to this protein').click();
      await see(chain.getByText('corrected'));
      await button(page, 'Confirm the 9 that are ready').click();
      await gone(page.getByText(/protein chains? waits? for you/));
      await see(page.getByText('2 decided').or(page.getByText('10 decided')));
    }),
  );

  // The same residue in three spellings: family and letter, family and number, chain and author number.
  test.each([
    ['cE62', [/^Family c, /]],
    ['c62', [/^Family c, residue 62/, /^Chain C, author number 62/, /^Amino acid Cys, number 62/]],
    ['A:62', [/^Chain A, author number 62/]],
  ] as const)('%s lists what it can mean and opens the residue', (address, meanings) =>
    walk(async (page) => {
      await toPlace(page, 'Find');
      const readings = await writeAddress(visitor, address);
      const groups = readings.getByRole('group');
      expect((await groups.allInnerTexts()).map(words)).toEqual(
        meanings.map((meaning) => expect.stringMatching(meaning)),
      );
      const own = groups.first().getByRole('option', { name: /^c, glutamate 62, .*ATPE2_ACEWO_4BEM/ });
      await own.click();
      await page.waitForURL(/\/residues\/[^/]+\/61(\?|$)/);
      await see(
        page.getByRole('heading', {
          level: 1,
          name: 'c, glutamate 62, sequence numbering, ATPE2_ACEWO_4BEM',
        }),
      );
    })(),
  );

  test(
    'the residue page reads it in every numbering, organism and copy',
    walk(async (page) => {
      expect(await facts(page.getByRole('region', { name: 'Passport' }).locator('dl'))).toEqual({
        'sequence, preferred': 'Glu62',
        // Source: the column in the file, counted by hand from the row ATPE2_ACEWO_4BEM.
        'alignment c_small_mafft, revision 1': 'column 81',
      });
      if (!isPhone) await page.getByRole('tab', { name: 'Column' }).click();
      const column = await tableRows(page.getByRole('table', { name: /^Rows of Column 81/ }));
      // Source: handbook 2.1 for E. coli, yeast and Acetobacterium woodii; the grade words are handbook 8.4.
      expect(column).toEqual([
        plateRow('c E62', 'ATPE2_ACEWO_4BEM', 'this residue'),
        plateRow(`c ${carboxylateName('E. coli')}`, 'ATPE_ECOLI', 'good similar letter'),
        plateRow('c D60', 'ATPE_VIBCH', 'good similar letter'),
        plateRow(`c ${carboxylateName('S. cerevisiae')}`, 'ATP9_YEAST_3U32', 'strong same letter'),
        plateRow(
          `c ${carboxylateName('Acetobacterium woodii', 'c1')}`,
          'ATPE1_ACEWO_4BEM',
          'strong same letter',
        ),
      ]);
      if (!isPhone) await page.getByRole('tab', { name: /^Copies/ }).click();
      const copies = await tableRows(page.getByRole('table', { name: 'Copies of this residue' }));
      // Source: handbook 1: chains A to I carry the carboxylate at 62.
      expect(copies).toEqual(
        [...'ABCDEFGHI'].map((one) => [`${one}:62`, '4bem', 'E', 'observed', 'confirmed']),
      );
      await link(page, /^Next residue: /).click();
      await page.waitForURL(/\/62$/);
      await see(page.getByRole('heading', { level: 1, name: /threonine 63/ }));
      await link(page, /^Previous residue: /).click();
      await page.waitForURL(/\/61$/);
    }),
  );

  test(
    'a numbering set by a curator is what every page says from then on',
    walk(async (page) => {
      await openResidue(page, 'ATPE1_ACEWO_4BEM', 79);
      await see(
        page.getByRole('heading', {
          level: 1,
          name: 'c, glutamate 79, sequence numbering, ATPE1_ACEWO_4BEM',
        }),
      );
      await page.goBack();
      await field(page, 'Name').fill('hairpin');
      await field(page, 'Number 1 is this residue of the sequence').fill('18');
      await button(page, 'Save the numbering').click();
      await see(page.getByText('Saved. Every screen shows hairpin numbers where it is preferred.'));
      // Residue 79 of the sequence, when residue 18 is number 1: 79 - 17.
      await field(page, 'Go to residue number, hairpin numbering').fill('62');
      await button(page, 'Go').click();
      await see(
        page.getByRole('heading', { level: 1, name: 'c, glutamate 62, hairpin numbering, ATPE1_ACEWO_4BEM' }),
      );
      const passport = await facts(page.getByRole('region', { name: 'Passport' }).locator('dl'));
      expect(passport).toMatchObject({ 'hairpin, preferred': 'Glu62', sequence: 'Glu79' });
      await locate(visitor, 'A:62', /ATPE2_ACEWO_4BEM/);
      await see(page.getByRole('heading', { level: 1, name: /glutamate 62, sequence numbering/ }));
      if (!isPhone) await page.getByRole('tab', { name: 'Column' }).click();
      await see(link(page, /^c, glutamate 62, hairpin numbering, ATPE1_ACEWO_4BEM/));
    }),
  );

  test(
    'a pin shows with all copies and, marked by equivalence, on the homologs',
    walk(async (page) => {
      await (isPhone ? button(page, 'Pin here') : button(page, 'Pin')).click();
      const form = page.getByRole('dialog', { name: 'Pin here' });
      await see(form.getByText('It holds for all copies.'));
      await field(form, 'Kind').selectOption('ion site');
      await field(form, 'What is known').fill('**Takes the ion**, as cE59 does in yeast.');
      await button(form, 'Add evidence').click();
      await field(form, 'Kind of evidence 1').selectOption('publication');
      await field(form, 'Where evidence 1 is found').fill('ring entry 4bem, remark 1');
      await form.getByRole('radio', { name: 'high' }).click();
      await button(form, 'Pin').click();
      await gone(form);
      const pin = page.getByRole('article', { name: 'ion site, proposed', exact: true });
      await see(
        pin.locator('strong', { hasText: 'Takes the ion' }),
        pin.getByText('publication: ring entry 4bem, remark 1'),
        pin.getByText(/confidence high, Ada Ring/),
        link(pin, /cE59|c, glutamate 59/),
      );
      // Another copy of the same residue: the pin is there too.
      await locate(visitor, 'F:62', /ATPE2_ACEWO_4BEM/);
      await see(page.getByRole('article', { name: 'ion site, proposed', exact: true }));
      if (!isPhone) await page.getByRole('tab', { name: 'Column' }).click();
      await link(page.getByRole('table', { name: /^Rows of Column/ }), /ATP9_YEAST_3U32/).click();
      await see(page.getByRole('heading', { level: 1, name: /glutamate 59, .*ATP9_YEAST_3U32/ }));
      const here = page.getByRole('article', { name: 'ion site, proposed, by equivalence' });
      await see(
        here,
        link(here, /^c, glutamate 62, sequence numbering, ATPE2_ACEWO_4BEM/),
        here.getByText('strong'),
      );
    }),
  );

  test(
    'a pin is edited with its versions kept, accepted, contested and retired',
    walk(async (page) => {
      await locate(visitor, 'A:62', /ATPE2_ACEWO_4BEM/);
      const pins = page.getByRole('region', { name: 'Pins' });
      await button(pins, /^What can be done with: /).click();
      await button(pins, /^Edit: /).click();
      const edit = page.getByRole('dialog', { name: 'Edit this pin' });
      await field(edit, 'What is known').fill('Takes the ion on each turn.');
      await button(edit, 'Save').click();
      await gone(edit);
      await see(pins.getByText('Takes the ion on each turn.'), pins.getByText(/version 2 by Ada Ring/));
      await button(pins, /^Versions: /).click();
      const versions = page.getByRole('dialog', { name: 'Versions of this pin' });
      await see(versions.getByText(/^Version 2, /), versions.getByText(/^Version 1, /));
      await button(versions, 'Close').click();
      await gone(versions);

      await button(pins, /^Accept: /).click();
      await see(pins.getByRole('article', { name: 'ion site, accepted' }));
      await button(pins, /^Contest: /).click();
      const contest = page.getByRole('dialog', { name: 'Contest this pin?' });
      await button(contest, 'Contest').click();
      await see(contest.getByRole('alert'));
      await field(contest, 'Reason').fill('The remark speaks of another entry.');
      await button(contest, 'Contest').click();
      await see(
        pins.getByRole('article', { name: 'ion site, contested' }),
        pins.getByText('The remark speaks of another entry.'),
      );
      await button(pins, /^Retire: /).click();
      const retire = page.getByRole('dialog', { name: 'Retire this pin?' });
      await field(retire, 'Reason').fill('Written anew elsewhere.');
      await button(retire, 'Retire').click();
      await see(pins.getByText('No pin here yet'));
      await button(pins, 'Show 1 retired').click();
      await see(
        pins.getByRole('article', { name: 'ion site, retired' }),
        pins.getByText('Written anew elsewhere.'),
      );
    }),
  );
});

/** A row of the column: plate, organism, and how sure the equivalence is. */
const plateRow = (plate: string, organism: string, equivalence: string) => [
  expect.stringContaining(plate),
  organism,
  equivalence,
];
