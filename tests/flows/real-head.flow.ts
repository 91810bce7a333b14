// A catalytic head on real files: 1cow.pdb, of which the project knows the γ subunit only (gamma_small_mafft.afa).
import { chainsShown, openChain, uploadStructure } from './support/chains';
import { placesAtBreaks, proteinsOf } from './support/expected';
import { openFlowStage, type FlowStage } from './support/stage';
import { phone, Visitor, wide } from './support/visitor';
import {
  button,
  facts,
  fixture,
  gone,
  link,
  makeProject,
  see,
  signUp,
  tableRows,
  uploadAlignment,
  writeAddress,
} from './support/walk';
import { withPage } from './support/with-page';

let stage: FlowStage;
beforeAll(async () => {
  stage = await openFlowStage();
});
afterAll(() => stage?.close());

describe.each([phone, wide])('the head on a $name screen', (size) => {
  const isPhone = size.name === 'phone';
  let visitor: Visitor;
  beforeAll(async () => {
    visitor = await Visitor.at(stage.browser, stage.server.origin, size);
  });
  afterAll(() => visitor?.close());
  const walk = (act: Parameters<typeof withPage>[1]) => withPage(() => visitor, act);

  test(
    'three aligned rows become three γ proteins',
    walk(async (page) => {
      await signUp(visitor, 'Bo Head');
      await makeProject(page, `Head on a ${size.name}`);
      await link(page, isPhone ? 'Upload a file' : 'Upload an alignment').click();
      await uploadAlignment(page, 'γ', fixture('alignments/gamma_small_mafft.afa'));
      await see(page.getByText('Stored. gamma_small_mafft.afa was read whole.'));
      await link(page, isPhone ? 'Family' : 'Open the family').click();
      const rows = await tableRows(page.getByRole('table', { name: 'Proteins of family γ' }));
      expect(rows).toEqual(proteinsOf('gamma_small_mafft.aln'));
    }),
  );

  test(
    'chain G is matched and the six others say that they match nothing',
    walk(async (page) => {
      await uploadStructure(page, fixture('structures/1cow.pdb'));
      await see(page.getByText('7 protein chains wait for you, or another curator.'));
      const shown = await chainsShown(page);
      const none = shown.filter((row) => row.endsWith('choose'));
      expect(none.map((row) => /^(?:\? )?([A-F](?:, [A-F])*) /.exec(row)?.[1]).join(', ')).toBe(
        'A, B, C, D, E, F',
      );
      for (const row of none)
        expect(row).toMatch(/(No protein is near: the best,|nearest) γ (of )?gamma_BOVIN/);
      // Source: handbook 1: chain G of this entry is bovine γ, the last row of the file.
      expect(shown.at(-1)).toMatch(/\bG .*gamma_BOVIN_5ARA_3.*100 %.*ready$/);
    }),
  );

  test(
    'the six are left out and G is confirmed',
    walk(async (page) => {
      await button(page, 'Confirm 1, leave 6 open').click();
      await see(page.getByText('6 protein chains wait for you, or another curator.'));
      for (const names of ['A, B', 'C', 'D', 'E, F']) {
        const chain = await openChain(page, names);
        await see(chain.getByText(/^No protein is near/));
        await chain.getByRole('radio', { name: 'Leave out' }).click();
        await button(chain, `Leave ${names} out`).click();
        await see(chain.getByText('left out', { exact: true }));
      }
      await gone(page.getByText(/protein chains? waits? for you/));
      await see(page.getByText('1 decided, 6 left out'));
    }),
  );

  const places = placesAtBreaks('1cow.pdb', 'G');
  test('there are breaks to read across', () => expect(places.length).toBeGreaterThan(2));
  test.each(places)('G:%s reads as %s in column %i', (number, letter, column) =>
    walk(async (page) => {
      const readings = await writeAddress(visitor, `G:${number}`);
      await readings.getByRole('option').click();
      await see(page.getByRole('heading', { level: 1, name: /^γ, .*gamma_BOVIN_5ARA_3/ }));
      const passport = await facts(page.getByRole('region', { name: 'Passport' }).locator('dl'));
      expect(passport).toMatchObject({ 'alignment gamma_small_mafft, revision 1': `column ${column}` });
      if (!isPhone) await page.getByRole('tab', { name: /^Copies/ }).click();
      const copies = await tableRows(page.getByRole('table', { name: 'Copies of this residue' }));
      expect(copies).toEqual([[`G:${number}`, '1cow', letter, 'observed', 'confirmed']]);
    })(),
  );
});
