// Forms that the walks on real files pass by: what is wrong is said at its field, what is right is kept.
import { openFlowStage, type FlowStage } from './support/stage';
import { Visitor, wide } from './support/visitor';
import { button, field, gone, link, makeProject, see, signUp, toPlace } from './support/walk';
import { withPage } from './support/with-page';

let stage: FlowStage;
let visitor: Visitor;
beforeAll(async () => {
  stage = await openFlowStage();
  visitor = await Visitor.at(stage.browser, stage.server.origin, wide);
});
afterAll(async () => {
  await visitor?.close();
  await stage?.close();
});
const walk = (act: Parameters<typeof withPage>[1]) => withPage(() => visitor, act);

test(
  'a family without a name is refused at its name, then added with its other spellings',
  walk(async (page) => {
    await signUp(visitor, 'Ines Form');
    await makeProject(page, 'Forms');
    await toPlace(page, 'Find');
    await button(page, 'Add a family').click();
    const form = page.getByRole('dialog', { name: 'Add a family' });
    await button(form, 'Add the family').click();
    await see(form.getByRole('alert'));
    expect(await field(form, 'Name').getAttribute('aria-invalid')).toBe('true');
    await field(form, 'Name').fill('OSCP');
    await field(form, 'Other spellings').fill('OSC, delta-like');
    await field(form, 'Part of the motor').selectOption('stalk');
    await button(form, 'Add the family').click();
    await see(form.getByText('A family name is letters, then digits or primes, without spaces.'));
    await field(form, 'Other spellings').fill('OSC, deltalike');
    await button(form, 'Add the family').click();
    await gone(form);
    await see(link(page, /^family OSCP, peripheral stalk/));
  }),
);

test(
  'who has no account cannot be added, and is told so at the address',
  walk(async (page) => {
    await link(page, /^Forms/).click();
    const form = page.getByRole('region', { name: 'Add somebody' });
    await field(form, 'E-mail').fill('nobody@lab.example');
    await form.getByRole('radio', { name: 'reader' }).click();
    await button(form, 'Add to the project').click();
    await see(form.getByRole('alert'));
    expect(await field(form, 'E-mail').getAttribute('aria-invalid')).toBe('true');
    expect(await page.getByRole('list', { name: 'Members' }).getByRole('listitem').count()).toBe(1);
  }),
);

test(
  'settings are kept, and say so until something else is written',
  walk(async (page) => {
    await link(page, 'Settings').click();
    await field(page, 'Name of the project').fill('Forms renamed');
    await page.getByRole('checkbox', { name: /Readers may comment/ }).check();
    await button(page, 'Save the settings').click();
    await see(page.getByText('Saved.', { exact: true }));
    await page.reload();
    await see(page.getByRole('heading', { name: 'Settings of Forms renamed' }));
    expect(await page.getByRole('checkbox', { name: /Readers may comment/ }).isChecked()).toBe(true);
    await field(page, 'Name of the project').fill('');
    await button(page, 'Save the settings').click();
    await see(page.getByRole('alert'));
  }),
);
