// Step 8 on real files: from the coding sequence of V. cholerae atpE to the primers of D60Q.
import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { codingBases, codingRecord } from '@/tests/support/stage';
import { aminoAcidsOf, productOfPair, rowOfFile } from './support/coding';
import { figuresCaution, primerCaution } from './support/expected';
import { openFlowStage, type FlowStage } from './support/stage';
import { phone, Visitor, wide } from './support/visitor';
import {
  button,
  choose,
  field,
  fixture,
  gone,
  link,
  makeProject,
  openResidue,
  see,
  signUp,
  tableRows,
  toPlace,
  uploadAlignment,
  words,
} from './support/walk';
import { withPage } from './support/with-page';

let stage: FlowStage;
beforeAll(async () => {
  stage = await openFlowStage();
});
afterAll(() => stage?.close());

const bases = codingBases('VIBCH_atpE');
const residues = rowOfFile('alignments/c_small_mafft.afa', 'ATPE_VIBCH');

describe.each([phone, wide])('a primer on a $name screen', (size) => {
  const isPhone = size.name === 'phone';
  let visitor: Visitor;
  beforeAll(async () => {
    visitor = await Visitor.at(stage.browser, stage.server.origin, size);
  });
  afterAll(() => visitor?.close());
  const walk = (act: Parameters<typeof withPage>[1]) => withPage(() => visitor, act);

  const addConstruct = async (page: Page, dna: string, start: number) => {
    await field(page, 'DNA').fill(dna);
    await field(page, 'First base of the coding part').fill(String(start));
    await button(page, 'Add the construct').click();
  };

  test(
    'a construct that does not encode the protein is refused with its place',
    walk(async (page) => {
      await signUp(visitor, 'Cy Primer');
      await makeProject(page, `Primers on a ${size.name}`);
      await link(page, isPhone ? 'Upload a file' : 'Upload an alignment').click();
      await uploadAlignment(page, 'c', fixture('alignments/c_small_mafft.afa'));
      await see(page.getByText('Stored. c_small_mafft.afa was read whole.'));
      await toPlace(page, 'Plan');
      await link(page, 'Add a construct').click();
      await field(page, 'Name').fill('pVc');
      await choose(field(page, 'Family'), /^c,/);
      await choose(field(page, 'Protein'), /^ATPE_VIBCH/);

      await addConstruct(page, codingRecord('VIBCH_atpE'), 2);
      await see(page.getByText(/^Not stored\. .*The whole protein is encoded from base 1/));
      await addConstruct(page, codingRecord('VIBCH_atpF'), 1);
      await see(page.getByText(/^Not stored\. .*breaks at residue \d+/));
      await toPlace(page, 'Plan');
      await see(page.getByText('No construct yet'));
    }),
  );

  test(
    'the coding sequence is added, and its draft was kept',
    walk(async (page) => {
      await link(page, 'Add a construct').click();
      await see(page.getByRole('heading', { name: 'Add a construct' }));
      await expect(field(page, 'Name').inputValue()).resolves.toBe('pVc');
      await addConstruct(page, codingRecord('VIBCH_atpE'), 1);
      await see(page.getByRole('heading', { level: 1, name: 'pVc' }));
      await see(page.getByText(`bases 1–${bases.length}`));
    }),
  );

  test(
    'a change whose letter is not there says what stands there and where one stands near',
    walk(async (page) => {
      await openResidue(page, 'ATPE_VIBCH', 60);
      await link(page, 'Plan a mutation').click();
      const change = field(page, 'Change');
      await see(page.getByText(/^At 60 stands Asp \(D\)\./));
      await expect(change.inputValue()).resolves.toBe('D60');
      await change.fill('E60Q');
      const near = [...residues].flatMap((letter, at) => (letter === 'E' ? [at + 1] : []));
      const nearest = near.sort((one, other) => Math.abs(one - 60) - Math.abs(other - 60))[0];
      await see(
        page.getByText(`E60Q: at 60 stands Asp (D), not Glu (E). The nearest E stands at ${nearest}.`),
      );
      await change.fill('D60Q');
      await see(page.getByText('the protein has it there'));
      await choose(field(page, 'Construct'), /^pVc/);
      await field(page, 'What it is for').fill('Takes the charge away.');
      await button(page, 'Plan and design primers').click();
      await see(page.getByRole('heading', { level: 1, name: /^Mutant D60Q/ }));
    }),
  );

  let primers: [string, string];
  test(
    'each design says its figures, its codons and the proof',
    walk(async (page) => {
      const table = page.getByRole('table', { name: 'The primers of this design' });
      const rows = await tableRows(table);
      const figures = Object.fromEntries(rows.map(([name = '', ...values]) => [name, values]));
      const [forward = '', reverse = ''] = (figures['bases, 5′ to 3′'] ?? []).map((one) =>
        one.replace(/ /g, ''),
      );
      primers = [forward, reverse];
      for (const [place, primer] of primers.entries()) {
        expect(figures['length, nt']?.[place]).toBe(String(primer.length));
        const gc = (100 * [...primer].filter((base) => 'GC'.includes(base)).length) / primer.length;
        expect(Number(figures['G and C, %']?.[place])).toBeCloseTo(gc, 1);
        expect(Number(figures['melting, °C']?.[place])).toBeGreaterThan(50);
      }
      // Source: the record's own bases 178 to 180, translated with NCBI table 11 (genetic-codes.json).
      const product = productOfPair(bases, forward, reverse, 177);
      expect(aminoAcidsOf(product)).toBe(`${residues.slice(0, 59)}Q${residues.slice(60)}*`);
      const heading = words(
        await page
          .getByText(/^codon 60$/)
          .locator('xpath=../..')
          .innerText(),
      );
      expect(heading).toContain(`${bases.slice(177, 180)} ${product.slice(177, 180)}`);
      const checks = page.getByRole('list', { name: 'Checks of this design' });
      await see(
        checks.getByText(/^passed Read back from the DNA/),
        checks.getByText(
          /Built from the primers and read back: 258 bases, 85 residues, D60Q and no other change\./,
        ),
      );
      const designs = page.getByRole('list', { name: 'Designs, best first' }).getByRole('listitem');
      expect(await designs.count()).toBeGreaterThan(1);
    }),
  );

  test(
    'a design is chosen and the list exported with the caution',
    walk(async (page) => {
      await button(page, 'Choose design 1').click();
      await see(page.getByText('chosen', { exact: true }));
      if (isPhone) await button(page, 'Export primers').click();
      const caution = page.getByText(primerCaution);
      await see(isPhone ? page.getByRole('dialog').getByText(primerCaution) : caution);
      const press = isPhone ? page.getByRole('dialog') : page;
      const [download] = await Promise.all([
        page.waitForEvent('download'),
        button(press, 'Export primers').click(),
      ]);
      expect(download.suggestedFilename()).toBe('primers.csv');
      const lines = (await readFile(await download.path(), 'utf8'))
        .replace(/^\uFEFF/, '')
        .trimEnd()
        .split('\r\n');
      for (const line of [lines[0], lines.at(-1)]) {
        expect(line).toContain(primerCaution);
        expect(line).toContain(figuresCaution);
      }
      const cells = lines.filter((line) => line.startsWith('D60Q')).map((line) => line.split(','));
      expect(cells.map(([, sequence, length]) => [sequence, length])).toEqual(
        primers.map((primer) => [primer, String(primer.length)]),
      );
      // Saving closes the caution, which covers a phone's screen.
      if (isPhone) await gone(page.getByRole('dialog'));
      await toPlace(page, 'Plan');
      await see(page.getByText('2 primers of 1 mutant'), page.getByText(primerCaution));
    }),
  );
});
